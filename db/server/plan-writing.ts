import { eq } from "drizzle-orm";
import type { SQLiteInsertValue, SQLiteTable } from "drizzle-orm/sqlite-core";
import {
  planAboard,
  planHydrometers,
  planItems,
  planMoves,
  planSeries,
  planSettings,
  planStations,
  planWaterPlaces,
  planWeights,
} from "../schema/plan";
import type { Database } from "./connection";
import { seriesToRows, stationToRow } from "./plan-rows";
import type { SheetWords } from "./sheet-words";
import type { Plan } from "./test-plan";

/** Replaces every row of a test's plan; the caller's transaction makes it one change. */
export function writePlanRows(db: Database, test: string, plan: Plan, words: SheetWords): void {
  clear(db, test);
  const listed = <T>(list: readonly T[]) => list.map((row, place) => ({ test, place, ...row }));
  put(
    db,
    planStations,
    plan.stations.map((station, place) => stationToRow(test, station, place, words.stations[station.id])),
  );
  put(
    db,
    planSeries,
    plan.stations.flatMap((station) => seriesToRows(test, station)),
  );
  put(db, planWeights, listed(plan.weights));
  put(db, planMoves, listed(plan.moves.map(({ no, session, positions }) => ({ no, session, positions, label: words.moves[no] }))));
  put(db, planHydrometers, listed(plan.hydrometers ?? []));
  put(db, planAboard, listed(plan.aboard));
  put(db, planItems, listed(plan.items));
  put(db, planWaterPlaces, listed(words.water.map(({ place: where, depth }) => ({ where, depth }))));
  const { settings = null, uncertainty = null } = plan;
  const once = { test, settings, uncertainty, rounds: words.rounds, markPlaces: words.marks, gasDangerous: words.gasDangerous ?? null };
  put(db, planSettings, [once]);
}

const tables = [planStations, planSeries, planWeights, planMoves, planHydrometers, planAboard, planItems, planWaterPlaces, planSettings];

function clear(db: Database, test: string): void {
  for (const table of tables) db.delete(table).where(eq(table.test, test)).run();
}

// a statement of no rows is no statement
function put<T extends SQLiteTable>(db: Database, table: T, rows: SQLiteInsertValue<T>[]): void {
  if (rows.length > 0) db.insert(table).values(rows).run();
}
