import { type PlaceInTable, placeInTable, valueAt } from "@/lib/numerics/interpolation";

/** A tank at one level of its table: volume, its centre, and the second moments of the free surface [m⁴]. */
export type LevelRow = {
  readonly level: number;
  readonly volume: number;
  readonly lcg: number;
  readonly tcg: number;
  readonly vcg: number;
  readonly inertia: number;
  readonly inertiaLongitudinal?: number;
};

/** Rows of one trim, level ascending. */
export type LevelTable = readonly LevelRow[];

/**
 * The row of a tank's table at a level, linear between its neighbours; null outside the table.
 *
 * Free surface is zero only where the tank is exactly empty or exactly full. A row without surface marks an end of the
 * range, not a value to slide towards: between it and its slack neighbour the neighbour's second moment holds, which is
 * exact for a tank with upright walls and on the side of more free surface for others.
 *
 * Source: no reduction of free surface but at empty and full: IMO 2008 IS Code, part A 3.1.3 (from memory).
 */
export function levelRow(rows: LevelTable, level: number): LevelRow | null {
  const place = placeInTable(
    rows.map((row) => row.level),
    level,
  );
  if (!place.ok) return null;
  const at = (column: "volume" | "lcg" | "tcg" | "vcg") =>
    valueAt(
      rows.map((row) => row[column]),
      place.value,
    );
  const row = {
    level,
    volume: at("volume"),
    lcg: at("lcg"),
    tcg: at("tcg"),
    vcg: at("vcg"),
    inertia: surfaceInertia(
      rows.map(({ inertia }) => inertia),
      place.value,
    ),
  };
  const longitudinal = rows.map(({ inertiaLongitudinal }) => inertiaLongitudinal);
  if (!longitudinal.every((value) => value !== undefined)) return row;
  return { ...row, inertiaLongitudinal: surfaceInertia(longitudinal, place.value) };
}

/** Lowest and highest level of a table. */
export function levelLimits(rows: LevelTable): { readonly lowest: number; readonly highest: number } {
  const levels = rows.map(({ level }) => level);
  return { lowest: Math.min(...levels), highest: Math.max(...levels) };
}

function surfaceInertia(inertias: readonly number[], place: PlaceInTable): number {
  const [low, high] = [inertias[place.index] as number, inertias[place.index + 1] ?? 0];
  const isBetweenRows = place.fraction > 0 && place.fraction < 1;
  return isBetweenRows && (low === 0 || high === 0) ? Math.max(low, high) : valueAt(inertias, place);
}
