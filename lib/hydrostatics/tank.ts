import { slopeAlongFromTrim } from "@/lib/frame";
import { answer, type Result, refuse } from "@/lib/result";
import type { TankBox } from "./box-liquid";
import { type LevelRow, type LevelTable, levelLimits, levelRow } from "./tank-level";

export type TankRow = LevelRow & { readonly trim?: number };

export type Tank = {
  readonly id: string;
  /** of the liquid [t/m³] */
  readonly density: number;
  /** what the table's `level` and the readings are: depth of liquid, or distance from the tank's reference down to it */
  readonly measure: "sounding" | "ullage";
  /** x and y of the sounding pipe */
  readonly pipe?: readonly [number, number];
  readonly table: readonly TankRow[];
  /** where the tank is one */
  readonly box?: TankBox;
};

/** The ship's attitude while the tank was sounded. */
export type Attitude = { readonly trim: number; readonly tanHeel: number; readonly lbp: number };

export type TankContents = {
  readonly mass: number;
  readonly volume: number;
  readonly lcg: number;
  readonly tcg: number;
  readonly vcg: number;
  /** second moment of the free surface about its own fore-and-aft axis [m⁴]; 0 only when exactly empty or full */
  readonly freeSurfaceInertia: number;
  readonly inertiaLongitudinal?: number;
  /** level the table was entered with, after the correction for the pipe's place */
  readonly level: number;
};

export type TankRefusal =
  | { readonly type: "EmptyTankTable"; readonly tank: string }
  | { readonly type: "FreeSurfaceUnknown"; readonly tank: string; readonly level: number }
  | { readonly type: "RepeatedTankLevel"; readonly tank: string; readonly level: number; readonly trim: number }
  | {
      readonly type: "OutsideTankTable";
      readonly tank: string;
      readonly quantity: "level" | "trim";
      readonly value: number;
      readonly asRead: number;
      readonly lowest: number;
      readonly highest: number;
    };

/**
 * Mass, centre and free surface of a tank's contents at a sounding or ullage.
 *
 * Linear in level, and in trim where the table has several. Where it has none and the pipe's place is known, the level is
 * carried along the liquid's surface, parallel to the waterplane, from the pipe to the tank's centre:
 *
 *     sounding at centre = sounding + b·(x − x_pipe) + c·(y − y_pipe);  ullage the other way,  b = −trim/L, c = tan(heel)
 *
 * A tank read as exactly empty or exactly full has no surface to tilt and is not corrected. With an ullage the table's
 * level is the ullage as read. Refuses levels and trims outside the table, with its limits, and a slack tank whose table has
 * rows for empty and full only and gives no free surface.
 *
 * Source: correction of soundings for trim and list, common practice; free surface see `levelRow`.
 */
export function tankContents(tank: Tank, level: number, attitude: Attitude): Result<TankContents, TankRefusal> {
  const tables = tablesByTrim(tank);
  if (!tables.ok) return tables;
  const [first, ...others] = tables.value;
  if (!first) return refuse({ type: "EmptyTankTable", tank: tank.id });
  const found =
    others.length > 0 ? rowBetweenTrims(tank, tables.value, level, attitude.trim) : rowAtCentre(tank, first.rows, level, attitude);
  if (!found.ok) return found;
  if (isSurfaceUnknown(tank, found.value)) return refuse({ type: "FreeSurfaceUnknown", tank: tank.id, level });
  const { inertia, ...row } = found.value;
  return answer({ ...row, mass: row.volume * tank.density, freeSurfaceInertia: inertia });
}

function isSurfaceUnknown(tank: Tank, { volume, inertia }: LevelRow): boolean {
  const full = Math.max(...tank.table.map((row) => row.volume));
  const isEnd = (contents: number) => contents === 0 || contents === full;
  return inertia === 0 && !isEnd(volume) && tank.table.every((row) => isEnd(row.volume));
}

type TableAtTrim = { readonly trim: number; readonly rows: LevelTable };

function tablesByTrim(tank: Tank): Result<readonly TableAtTrim[], TankRefusal> {
  const trims = [...new Set(tank.table.map(({ trim = 0 }) => trim))].sort((a, b) => a - b);
  const tables = trims.map((trim) => ({ trim, rows: rowsAtTrim(tank, trim) }));
  for (const { trim, rows } of tables) {
    const twice = rows.find((row, i) => row.level === rows[i + 1]?.level);
    if (twice) return refuse({ type: "RepeatedTankLevel", tank: tank.id, level: twice.level, trim });
  }
  return answer(tables);
}

function rowsAtTrim(tank: Tank, wanted: number): LevelTable {
  const rows = tank.table.filter(({ trim = 0 }) => trim === wanted);
  return rows.map(({ trim, ...row }) => row).sort((a, b) => a.level - b.level);
}

function rowAtCentre(tank: Tank, rows: LevelTable, level: number, attitude: Attitude): Result<LevelRow, TankRefusal> {
  const asRead = levelRow(rows, level);
  if (!asRead) return refuse(outsideLevels(tank, rows, level, level));
  if (!tank.pipe || rows.length === 1 || isEmptyOrFull(rows, asRead)) return answer(asRead);
  const corrected = level + levelChange(tank.pipe, asRead, attitude) * (tank.measure === "sounding" ? 1 : -1);
  const row = levelRow(rows, corrected);
  return row ? answer(row) : refuse(outsideLevels(tank, rows, corrected, level));
}

// rise of the liquid's surface from the pipe to the centre of the contents
function levelChange([x, y]: readonly [number, number], { lcg, tcg }: LevelRow, { trim, tanHeel, lbp }: Attitude): number {
  return slopeAlongFromTrim(trim, lbp) * (lcg - x) + tanHeel * (tcg - y);
}

function isEmptyOrFull(rows: LevelTable, { volume }: LevelRow): boolean {
  return volume === 0 || volume === Math.max(...rows.map((row) => row.volume));
}

function rowBetweenTrims(tank: Tank, tables: readonly TableAtTrim[], level: number, trim: number): Result<LevelRow, TankRefusal> {
  const trims = tables.map((table) => table.trim);
  const [lowest, highest] = [trims[0] as number, trims.at(-1) as number];
  const above = tables.findIndex((table, i) => i > 0 && trim <= table.trim);
  const [low, high] = [tables[above - 1], tables[above]];
  if (trim < lowest || !low || !high) {
    return refuse({ type: "OutsideTankTable", tank: tank.id, quantity: "trim", value: trim, asRead: trim, lowest, highest });
  }
  const [atLow, atHigh] = [levelRow(low.rows, level), levelRow(high.rows, level)];
  if (!atLow) return refuse(outsideLevels(tank, low.rows, level, level));
  if (!atHigh) return refuse(outsideLevels(tank, high.rows, level, level));
  return answer(mixedRow(atLow, atHigh, (trim - low.trim) / (high.trim - low.trim)));
}

function mixedRow(low: LevelRow, high: LevelRow, fraction: number): LevelRow {
  const mixed = (a: number, b: number) => (a === b ? a : a + fraction * (b - a));
  const { inertiaLongitudinal: lowLongitudinal, ...rest } = low;
  const row = {
    level: mixed(rest.level, high.level),
    volume: mixed(rest.volume, high.volume),
    lcg: mixed(rest.lcg, high.lcg),
    tcg: mixed(rest.tcg, high.tcg),
    vcg: mixed(rest.vcg, high.vcg),
    inertia: mixed(rest.inertia, high.inertia),
  };
  if (lowLongitudinal === undefined || high.inertiaLongitudinal === undefined) return row;
  return { ...row, inertiaLongitudinal: mixed(lowLongitudinal, high.inertiaLongitudinal) };
}

function outsideLevels(tank: Tank, rows: LevelTable, value: number, asRead: number): TankRefusal {
  return { type: "OutsideTankTable", tank: tank.id, quantity: "level", value, asRead, ...levelLimits(rows) };
}
