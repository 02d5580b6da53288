import type { Waterline } from "@/lib/hydrostatics/waterline";
import { mean } from "@/lib/numerics/sum";
import { type Looks, readingsThatCount } from "./readings-that-count";
import { waterlineAtZero } from "./ship-afloat";
import type { IncliningTestData } from "./test-data";
import type { MarkReading, Round } from "./test-readings";

/** A mark or freeboard as it was read in the round that counts [m]. */
export type MarkRead = {
  readonly mark: string;
  readonly kind: "draft" | "freeboard";
  /** mean of all estimates, as it stands on the hull */
  readonly value: number;
  readonly estimates: number;
  /** standard uncertainty of the mean by the scatter of the estimates; null with one only */
  readonly scatter: number | null;
  /** height of the water there, measured − fitted */
  readonly residual: number;
  /** reading of the round after less that of the round before; null where it was not read in both */
  readonly change: number | null;
};

/** The waterline of each round by itself; null where the round's marks give none. */
export type DraftRounds = { readonly before: Waterline | null; readonly after: Waterline | null };

/** Every mark and freeboard of the counted round, with what it is off the waterline and how it changed until the round after. */
export function marksRead(test: IncliningTestData, waterline: Waterline): readonly MarkRead[] {
  const { drafts, freeboards } = readingsThatCount(test);
  const after = readingsThatCount(withRound(test, "after"));
  const isTwice = drafts.concat(freeboards).some(([look]) => look?.value.round === "before");
  const read = (looks: Looks<MarkReading>, kind: MarkRead["kind"], later: readonly Looks<MarkReading>[]): MarkRead => {
    const mark = looks[0]?.value.mark ?? "";
    const estimates = estimatesOf(looks);
    const again = later.find(([look]) => look?.value.mark === mark);
    return {
      mark,
      kind,
      value: mean(estimates),
      estimates: estimates.length,
      scatter: waterline.points.find((point) => point.mark === mark)?.scatter ?? null,
      residual: waterline.residuals[mark] ?? 0,
      change: again && isTwice ? mean(estimatesOf(again)) - mean(estimates) : null,
    };
  };
  return [
    ...drafts.map((looks) => read(looks, "draft", after.drafts)),
    ...freeboards.map((looks) => read(looks, "freeboard", after.freeboards)),
  ];
}

/** Both rounds, each fitted apart, so that they can be compared. */
export function draftRounds(test: IncliningTestData): DraftRounds {
  return { before: waterlineOfRound(test, "before"), after: waterlineOfRound(test, "after") };
}

/** The waterline that the marks of one round agree on; null where they give none. */
export function waterlineOfRound(test: IncliningTestData, round: Round): Waterline | null {
  const ofRound = withRound(test, round);
  const waterline = waterlineAtZero(ofRound, readingsThatCount(ofRound));
  return waterline.ok ? waterline.value : null;
}

function withRound(test: IncliningTestData, round: Round): IncliningTestData {
  const isOfRound = (mark: MarkReading) => mark.round === round;
  const { drafts, freeboards = [] } = test.readings;
  return { ...test, readings: { ...test.readings, drafts: drafts.filter(isOfRound), freeboards: freeboards.filter(isOfRound) } };
}

// several looks at one mark count by the mean of each, as the waterline takes them
function estimatesOf(looks: Looks<MarkReading>): readonly number[] {
  const [only, ...others] = looks.map(({ value: { value, estimates } }) => (estimates && estimates.length > 0 ? estimates : [value]));
  return others.length === 0 ? (only ?? []) : [only ?? [], ...others].map((each) => mean(each));
}
