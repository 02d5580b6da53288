import type { Place, Station } from "@/lib/inclining/test-plan";
import type { LightshipTestData } from "./inclining-result";
import type { LightshipItem } from "./lightship";

/** A test as it would stand if something laid down in its plan were another. Tonnes, metres, t/m³. */

export type PlaceOfWeight = { readonly weight: string; readonly place: Place };
export type Listed = { readonly mass: number; readonly x: number; readonly z: number };

/** A weight of another mass. */
export function withMass(given: LightshipTestData, id: string, by: number): LightshipTestData {
  return { ...given, weights: changed(given.weights, id, (weight) => ({ ...weight, mass: weight.mass + by })) };
}

/** A weight that stood elsewhere athwartships, whenever it stood in that place. */
export function withPlace(given: LightshipTestData, { weight, place }: PlaceOfWeight, by: number): LightshipTestData {
  const key = placeKey({ weight, place });
  const moves = given.moves.map((move) => {
    const standing = move.positions[weight];
    if (standing === undefined || placeKey({ weight, place: standing }) !== key) return move;
    const [x, y, z] = standing;
    return { ...move, positions: { ...move.positions, [weight]: [x, y + by, z] as const } };
  });
  return { ...given, moves };
}

/** The same for two places of a weight that are one to the millimetre: put back on its mark it stands there again. */
export function placeKey({ weight, place }: PlaceOfWeight): string {
  return `${weight} ${place.map((metres) => Math.round(1000 * metres)).join(" ")}`;
}

/** A pendulum or a U-tube of another length or span, in all its series. */
export function withLength(given: LightshipTestData, id: string, by: number): LightshipTestData {
  const stations = changed(given.stations, id, (station): Station => {
    if (station.instrument === "pendulum") {
      const series = station.series?.map((one) => (one.length === undefined ? one : { ...one, length: one.length + by }));
      return { ...station, length: station.length + by, ...(series && { series }) };
    }
    if (station.instrument === "u-tube") {
      const series = station.series?.map((one) => (one.span === undefined ? one : { ...one, span: one.span + by }));
      return { ...station, span: station.span + by, ...(series && { series }) };
    }
    return station;
  });
  return { ...given, stations };
}

/** A draft mark whose zero lies at another height. */
export function withZero(given: LightshipTestData, id: string, by: number): LightshipTestData {
  return { ...given, draftMarks: changed(given.draftMarks, id, (mark) => ({ ...mark, zero: mark.zero + by })) };
}

/** An item or an entry of persons with another mass, place along or height. */
export function withEntry(
  given: LightshipTestData,
  list: "items" | "persons",
  index: number,
  key: keyof Listed,
  by: number,
): LightshipTestData {
  const off = <T extends Listed>(entries: readonly T[]) =>
    entries.map((entry, i) => (i === index ? { ...entry, [key]: entry[key] + by } : entry));
  return list === "items" ? { ...given, items: off<LightshipItem>(given.items) } : { ...given, aboard: off(given.aboard) };
}

/** A tank that holds more at every level, relative. */
export function withTankVolume(given: LightshipTestData, id: string, by: number): LightshipTestData {
  const tanks = changed(given.tanks, id, (tank) => {
    const table = tank.table.map((row) => ({ ...row, volume: row.volume * (1 + by) }));
    return { ...tank, table };
  });
  return { ...given, tanks };
}

/** A liquid of another density. */
export function withLiquidDensity(given: LightshipTestData, id: string, by: number): LightshipTestData {
  return { ...given, tanks: changed(given.tanks, id, (tank) => ({ ...tank, density: tank.density + by })) };
}

/** A ship that displaces more at every waterline, relative; by offsets her waterplane stays as it is. */
export function withVolume(given: LightshipTestData, by: number): LightshipTestData {
  const { hydrostatics } = given;
  if (hydrostatics.kind === "table") {
    const rows = hydrostatics.rows.map((row) => ({ ...row, volume: row.volume * (1 + by) }));
    return { ...given, hydrostatics: { ...hydrostatics, rows } };
  }
  const appendages = hydrostatics.appendages?.map((each) => ({ ...each, volume: each.volume * (1 + by) }));
  const shellFactor = (hydrostatics.shellFactor ?? 1) * (1 + by);
  return { ...given, hydrostatics: { ...hydrostatics, shellFactor, ...(appendages && { appendages }) } };
}

function changed<T extends { readonly id: string }>(list: readonly T[], id: string, change: (one: T) => T): readonly T[] {
  return list.map((one) => (one.id === id ? change(one) : one));
}
