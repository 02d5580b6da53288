import { type Waterplane, waterplaneHeight } from "@/lib/frame";
import { gathered } from "@/lib/inclining/faults";
import type { Noise } from "@/lib/numerics/seeded-noise";
import type { TestRecord } from "@/lib/record/test-record";
import { answer, type Result } from "@/lib/result";
import { restAt, type SimulatedShip } from "./simulated-ship";

/** How well a simulated crew reads: standard deviations. Every reading is given to its own smallest division. */
export type ReadingQuality = {
  /** of each mark of a bob or level of a leg [mm] */
  readonly battenMm: number;
  /** of each angle [degrees] */
  readonly angleDegrees: number;
  /** of the heel at each move, felt by all stations alike: gusts and taut lines [tangent] */
  readonly gust: number;
  /** of each estimate of a draft or freeboard [m] */
  readonly draft: number;
  /** of each sample [t/m³] */
  readonly density: number;
  /** how many readings a batten allows in a millimetre, and a draft mark in a metre; null: not rounded */
  readonly perMillimetre: number | null;
  readonly perMetre: number | null;
  /** how many readings a hydrometer allows in 1 t/m³ */
  readonly perDensity: number | null;
};

/** A crew that reads what is there. */
export const perfectReadings: ReadingQuality = {
  battenMm: 0,
  angleDegrees: 0,
  gust: 0,
  draft: 0,
  density: 0,
  perMillimetre: null,
  perMetre: null,
  perDensity: null,
};

/** A careful crew on a calm day, drafts read in a glass tube that stills the water. */
export const carefulReadings: ReadingQuality = {
  battenMm: 0.4,
  angleDegrees: 0.005,
  gust: 3e-5,
  draft: 0.001,
  density: 0.0001,
  perMillimetre: 2,
  perMetre: 1000,
  perDensity: 10_000,
};

type Readings = TestRecord["readings"];

/**
 * The readings of a whole test on a simulated ship: battens at every move (swings for pendulums, settled legs for U-tubes,
 * settled angles for inclinometers), drafts and freeboards before and after, soundings, and water at three places.
 *
 * Each station has an arbitrary zero of its own. Draft marks are upright; soundings are the truth's, read at the tank's centre.
 * Refused: what `restAt` refuses.
 */
export function simulatedReadings(ship: SimulatedShip, quality: ReadingQuality, noise: Noise): Result<Readings> {
  const atMoves = gathered(ship.plan.moves.map(({ no }) => restAt(ship, no, "moves")));
  const atDrafts = restAt(ship, 0, "drafts");
  if (!atMoves.ok) return atMoves;
  if (!atDrafts.ok) return atDrafts;
  const crew = { quality, noise, id: idsFrom(noise) };
  return answer({
    battens: battensRead(ship.plan, atMoves.value, crew),
    ...marksRead(ship.plan, atDrafts.value, crew),
    soundings: rounds.flatMap((round) => ship.plan.tanks.map(({ id }) => ({ id: crew.id(), tank: id, round, value: levelOf(ship, id) }))),
    water: waterRead(ship, crew),
  });
}

type Crew = { readonly quality: ReadingQuality; readonly noise: Noise; readonly id: () => string };
type Batten = Readings["battens"][number];
type Station = TestRecord["stations"][number];

const rounds = ["before", "after"] as const;

/** Height of successive turning points about the resting point, as shares of the first: a swing that dies away evenly. */
const swing = [1, -0.8, 0.6, -0.4, 0.2];

function battensRead(plan: TestRecord, planes: readonly Waterplane[], crew: Crew): Batten[] {
  const zeros = plan.stations.map(() => Math.round(60 * crew.noise.uniform()));
  return plan.moves.flatMap(({ no, repeat, session }, k) => {
    const tanHeel = (planes[k]?.tanHeel ?? 0) + crew.noise.normal(crew.quality.gust);
    return plan.stations.map((station, j): Batten => {
      const at = { id: crew.id(), move: no, station: station.id, ...(repeat && { repeat }), ...(session && { session }) };
      return { ...at, ...battenValue(station, station.reversed ? -tanHeel : tanHeel, zeros[j] ?? 0, crew) };
    });
  });
}

function battenValue(station: Station, tanHeel: number, zero: number, { quality, noise }: Crew) {
  const marked = (mm: number) => rounded(mm + noise.normal(quality.battenMm), quality.perMillimetre);
  if (station.instrument === "pendulum") {
    const rest = zero + 1000 * station.length * tanHeel;
    const height = 4 + 8 * noise.uniform();
    return { mode: "turning-points" as const, valuesMm: swing.map((share) => marked(rest + share * height)) };
  }
  if (station.instrument === "u-tube") {
    const rise = (1000 * station.span * tanHeel) / 2;
    return { mode: "settled" as const, portMm: [marked(300 + zero - rise)], starboardMm: [marked(300 + rise)] };
  }
  const degrees = (Math.atan(tanHeel) * 180) / Math.PI + zero / 100 + noise.normal(quality.angleDegrees);
  return { mode: "settled" as const, valuesDegrees: [degrees] };
}

function marksRead(plan: TestRecord, plane: Waterplane, crew: Crew): Pick<Readings, "drafts" | "freeboards"> {
  const { freeboardMarks = [] } = plan;
  const drafts = rounds.flatMap((round) =>
    plan.draftMarks.map(({ id, x, y, zero }) => markRead(id, round, waterplaneHeight(plane, x, y) - zero, crew)),
  );
  const freeboards = rounds.flatMap((round) =>
    freeboardMarks.map(({ id, x, y, deckEdge }) => markRead(id, round, deckEdge - waterplaneHeight(plane, x, y), crew)),
  );
  return freeboardMarks.length > 0 ? { drafts, freeboards } : { drafts };
}

function markRead(mark: string, round: (typeof rounds)[number], height: number, { quality, noise, id }: Crew) {
  return { id: id(), mark, round, value: rounded(height + noise.normal(quality.draft), quality.perMetre) };
}

function waterRead({ truth, plan }: SimulatedShip, { quality, noise, id }: Crew): Readings["water"] {
  const hydrometer = plan.hydrometers?.[0]?.id;
  return ["aft", "midships", "forward"].flatMap((place) =>
    [1, 2.5].map((depth) => {
      const density = rounded(truth.waterDensity + noise.normal(quality.density), quality.perDensity);
      return { id: id(), place, depth, round: "before" as const, density, ...(hydrometer && { hydrometer }) };
    }),
  );
}

function levelOf({ truth }: SimulatedShip, tank: string): number {
  return truth.levels[tank] ?? 0;
}

function rounded(value: number, perUnit: number | null): number {
  return perUnit === null ? value : Math.round(value * perUnit) / perUnit;
}

// shaped as random UUIDs are, but the same for the same seed
function idsFrom({ uniform }: Noise): () => string {
  const hex = (digits: number) => Array.from({ length: digits }, () => Math.floor(16 * uniform()).toString(16)).join("");
  return () => `${hex(8)}-${hex(4)}-4${hex(3)}-8${hex(3)}-${hex(12)}`;
}
