import type { MomentTangentLine } from "../inclined-ship";
import type { ShipAfloat } from "../ship-afloat";
import type { IncliningTestData } from "../test-data";
import type { CheckLimits } from "./check-limits";
import { type Finding, metOrAttention, metOrNot } from "./finding";

/** Whether the ship was heeled far enough and not too far, to both sides alike, from the zero of the test [degrees]. */
export function heelRange({ moves }: MomentTangentLine, { heel: [least, most] }: CheckLimits): Finding {
  const degrees = moves.map(({ tanHeel }) => (Math.atan(tanHeel) * 180) / Math.PI);
  const found = farthest(degrees);
  const sides = [found.port, found.starboard];
  const isMet = sides.every((side) => isWithin(side, least, most));
  return { id: "heel-range", verdict: metOrNot(isMet), found, limit: { least, most } };
}

/** How far each pendulum's bob moved to each side of its zero [mm]; the one that moved least. Nothing without pendulums. */
export function deflection(test: IncliningTestData, line: MomentTangentLine, { deflectionMm: leastMm }: CheckLimits): readonly Finding[] {
  const moved = line.stations.flatMap((station) => {
    const length = pendulumLength(test, station.id, station.series);
    if (length === null) return [];
    const offZero = station.commonResiduals.map(({ tan }) => (tan - station.commonIntercept) * length * 1000);
    return [{ ...farthest(offZero), station: station.id }];
  });
  const [least] = moved.sort((a, b) => Math.min(a.port, a.starboard) - Math.min(b.port, b.starboard));
  if (least === undefined) return [];
  const isMet = isWithin(Math.min(least.port, least.starboard), leastMm, Number.POSITIVE_INFINITY);
  return [{ id: "deflection", verdict: metOrNot(isMet), found: least, limit: { leastMm } }];
}

/** The list at the zero of the test, by the marks [degrees]. */
export function initialList({ waterline }: ShipAfloat, { initialList: most }: CheckLimits): Finding {
  const degrees = waterline.heelDegrees;
  return { id: "initial-list", verdict: metOrNot(Math.abs(degrees) <= most), found: { degrees }, limit: { most } };
}

/** How far the trim lies beyond the trims for which the hydrostatics are given; offsets are given for any trim. */
export function trimOfHydrostatics(
  { hydrostatics, vessel }: IncliningTestData,
  { waterline: { trim } }: ShipAfloat,
  { trim: most }: CheckLimits,
): Finding {
  const beyond = hydrostatics.kind === "table" ? trimBeyond(trim, new Set(hydrostatics.rows.map((row) => row.trim))) : 0;
  const share = Math.abs(beyond) / vessel.lbp;
  return { id: "trim", verdict: metOrAttention(share <= most), found: { beyond, share }, limit: { share: most } };
}

function farthest(values: readonly number[]) {
  return { port: Math.max(0, ...values.map((value) => -value)), starboard: Math.max(0, ...values) };
}

// a heel of exactly the limit must not fail by rounding
function isWithin(value: number, least: number, most: number): boolean {
  return value >= least * (1 - 1e-9) && value <= most * (1 + 1e-9);
}

function pendulumLength({ stations }: IncliningTestData, id: string, series: number): number | null {
  const station = stations.find((each) => each.id === id);
  if (station?.instrument !== "pendulum") return null;
  return station.series?.find(({ no }) => no === series)?.length ?? station.length;
}

function trimBeyond(trim: number, given: ReadonlySet<number>): number {
  const lowest = Math.min(...given);
  const highest = Math.max(...given);
  return trim > highest ? trim - highest : Math.min(0, trim - lowest);
}
