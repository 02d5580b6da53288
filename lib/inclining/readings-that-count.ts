import type { IncliningTestData } from "./test-data";
import type { Move } from "./test-plan";
import type { BattenReading, MarkReading, Provenance, Round, SoundingReading, WaterReading } from "./test-readings";

/** A reading or a move with its place in the record. */
export type Placed<T> = { readonly value: T; readonly path: string };

/** The readings that stand in one slot: several are looks at the same thing, and their mean counts. */
export type Looks<T> = readonly Placed<T>[];

export type CountedReadings = {
  readonly moves: readonly Placed<Move>[];
  readonly battens: readonly Looks<BattenReading>[];
  readonly drafts: readonly Looks<MarkReading>[];
  readonly freeboards: readonly Looks<MarkReading>[];
  readonly soundings: readonly Looks<SoundingReading>[];
  readonly ballast: readonly Looks<SoundingReading>[];
  readonly water: readonly Looks<WaterReading>[];
};

/**
 * The readings of a test that count: accepted ones; of a move the last repeat unless that is excluded;
 * the round "before" where both exist; a value by radio or on paper only while the station's own is absent.
 *
 * Drafts, freeboards and water change rounds together; each tank for itself.
 */
export function readingsThatCount(test: IncliningTestData): CountedReadings {
  const { readings } = test;
  const battens = accepted(readings.battens, "readings.battens");
  const moves = movesThatCount(test.moves, battens);
  const [drafts, freeboards] = roundOfMarks(
    accepted(readings.drafts, "readings.drafts"),
    accepted(readings.freeboards ?? [], "readings.freeboards"),
  );
  const soundings = accepted(readings.soundings, "readings.soundings");
  return {
    moves: moves.map((run) => run.move),
    battens: slots(
      battens.filter(({ value }) => moves.some((run) => isReadAt(value, run))),
      ({ session, move, station, series }) => [session ?? 1, move, station, series ?? 1],
    ),
    drafts: slots(drafts, ({ mark }) => [mark]),
    freeboards: slots(freeboards, ({ mark }) => [mark]),
    soundings: firstRoundOfEach(soundings),
    ballast: slots(
      soundings.filter(({ value }) => value.move !== undefined),
      ({ tank, move }) => [tank, move ?? 0],
    ),
    water: slots(firstRound(accepted(readings.water, "readings.water")), ({ place, depth }) => [place, depth]),
  };
}

type Run = { readonly move: Placed<Move>; readonly repeat: number };

/** The last repeat of each move, whether the plan or a reading knows of it; a move whose last repeat is excluded is out. */
function movesThatCount(moves: readonly Move[], battens: readonly Placed<BattenReading>[]): readonly Run[] {
  const placed = moves.map((value, i) => ({ value, path: `moves[${i}]` }));
  return [...grouped(placed, ({ session, no }) => [session ?? 1, no]).values()].flatMap((entries) => {
    const move = entries.reduce((last, entry) => ((entry.value.repeat ?? 1) >= (last.value.repeat ?? 1) ? entry : last));
    const read = battens.filter(({ value }) => isSameMove(value, move.value)).map(({ value }) => value.repeat ?? 1);
    const repeat = Math.max(move.value.repeat ?? 1, ...read);
    return move.value.excluded !== undefined && repeat === (move.value.repeat ?? 1) ? [] : [{ move, repeat }];
  });
}

function isSameMove(reading: BattenReading, move: Move): boolean {
  return reading.move === move.no && (reading.session ?? 1) === (move.session ?? 1);
}

function isReadAt(reading: BattenReading, run: Run): boolean {
  return isSameMove(reading, run.move.value) && (reading.repeat ?? 1) === run.repeat;
}

function accepted<T extends Provenance>(readings: readonly T[], path: string): readonly Placed<T>[] {
  const placed = readings.map((value, i) => ({ value, path: `${path}[${i}]` }));
  return placed.filter(({ value }) => (value.status ?? "accepted") === "accepted");
}

function slots<T extends Provenance>(readings: readonly Placed<T>[], slotOf: (reading: T) => (string | number)[]): readonly Looks<T>[] {
  return [...grouped(readings, slotOf).values()].map((looks) => {
    const own = looks.filter(({ value }) => (value.source ?? "station") === "station");
    return own.length > 0 ? own : looks;
  });
}

function roundOfMarks(drafts: readonly Placed<MarkReading>[], freeboards: readonly Placed<MarkReading>[]) {
  const round = roundOf([...drafts, ...freeboards]);
  const isOfRound = ({ value }: Placed<MarkReading>) => value.round === round;
  return [drafts.filter(isOfRound), freeboards.filter(isOfRound)] as const;
}

function firstRoundOfEach(soundings: readonly Placed<SoundingReading>[]): readonly Looks<SoundingReading>[] {
  const ofRounds = soundings.filter(({ value }) => value.move === undefined);
  const byTank = [...grouped(ofRounds, ({ tank }) => [tank]).values()];
  return slots(
    byTank.flatMap((readings) => firstRound(readings)),
    ({ tank }) => [tank],
  );
}

function firstRound<T extends { readonly round?: Round }>(readings: readonly Placed<T>[]): readonly Placed<T>[] {
  const round = roundOf(readings);
  return readings.filter(({ value }) => (value.round ?? "before") === round);
}

function roundOf(readings: readonly Placed<{ readonly round?: Round }>[]): Round {
  return readings.every(({ value }) => value.round === "after") ? "after" : "before";
}

function grouped<T>(readings: readonly Placed<T>[], keyOf: (reading: T) => (string | number)[]): Map<string, Placed<T>[]> {
  const groups = new Map<string, Placed<T>[]>();
  for (const placed of readings) {
    const key = JSON.stringify(keyOf(placed.value));
    groups.set(key, [...(groups.get(key) ?? []), placed]);
  }
  return groups;
}
