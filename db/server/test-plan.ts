import { asc, eq } from "drizzle-orm";
import { z } from "zod";
import { canonicalJson } from "@/lib/ledger/canonical-json";
import { type TestRecord, testRecordSchema } from "@/lib/record/test-record";
import { answer, type Result, refuse } from "@/lib/result";
import { planAboard, planHydrometers, planItems, planMoves, planSeries, planStations, planWeights } from "../schema/plan";
import { tests } from "../schema/tests";
import type { Act } from "./act";
import { type Database, inTransaction } from "./connection";
import { writeEntry } from "./ledger-entries";
import { aboardFromRow, hydrometerFromRow, itemFromRow, moveFromRow, present, some, stationFromRow, weightFromRow } from "./plan-rows";
import { writePlanRows } from "./plan-writing";
import { planSettingsOf, type SheetWords, sheetWords } from "./sheet-words";
import { standAgain } from "./slot-standing";
import { type Test, testById } from "./tests";

const { shape } = testRecordSchema;

/** What the plan of a test says: everything of a record but what the day brings. */
export const planSchema = z.strictObject({
  hydrostatics: shape.hydrostatics,
  draftMarks: shape.draftMarks,
  freeboardMarks: shape.freeboardMarks,
  stations: shape.stations,
  weights: shape.weights,
  moves: shape.moves,
  tanks: shape.tanks,
  aboard: shape.aboard,
  items: shape.items,
  hydrometers: shape.hydrometers,
  previous: shape.previous,
  settings: shape.settings,
  uncertainty: shape.uncertainty,
});
export type Plan = z.infer<typeof planSchema>;

export type PlanRefusal =
  | { type: "TestUnknown"; test: string }
  | { type: "TestHandedOver"; test: string }
  | { type: "MoveTwice"; move: number; path: string }
  | { type: "NameTwice"; name: string; path: string }
  | { type: "NameInUse"; name: string; path: string };

/** The plan of a test as a record without readings. Broken promise: the test is known. */
export function planRecord(db: Database, test: string): TestRecord {
  const row = testById(db, test);
  if (!row) throw new Error(`no test ${test} on this server`);
  const { id, title, date, place, note, vesselCopy } = row;
  const readings = { battens: [], drafts: [], soundings: [], water: [] };
  return {
    format: "battenbook-record",
    version: 1,
    test: { id, title, date, place, ...present({ note }) },
    ...vesselCopy,
    ...rowsOf(db, test),
    readings,
    ...present(planSettingsOf(db, test)),
  };
}

/**
 * Replaces the plan of a test. Its copy of the vessel changes with it; the office's vessel does not.
 *
 * Refused once the test has left planning: taking away a move, station, weight, mark or tank, because readings may
 * stand on its name.
 */
export function savePlan(db: Database, test: string, plan: Plan, words: SheetWords | null, act: Act): Result<string, PlanRefusal> {
  return inTransaction(db, () => {
    const row = testById(db, test);
    if (!row) return refuse({ type: "TestUnknown", test });
    const refusal = row.custody === "handed-over" ? ({ type: "TestHandedOver", test } as const) : planRefusal(db, row, plan);
    if (refusal) return refuse(refusal);
    const before = planOf(planRecord(db, test));
    writePlanRows(db, test, plan, words ?? sheetWords(db, test));
    const { hydrostatics, draftMarks, freeboardMarks, tanks, previous } = plan;
    const vesselCopy = { vessel: row.vesselCopy.vessel, hydrostatics, draftMarks, freeboardMarks, tanks, previous };
    db.update(tests).set({ vesselCopy }).where(eq(tests.id, test)).run();
    standAgain(db, test);
    writeEntry(db, test, { ...act, what: "plan.save", before: changedParts(before, plan), after: changedParts(plan, before) });
    return answer(test);
  });
}

/** The plan's part of a record. */
export function planOf(record: TestRecord): Plan {
  const {
    hydrostatics,
    draftMarks,
    freeboardMarks,
    stations,
    weights,
    tanks,
    aboard,
    items,
    hydrometers,
    previous,
    settings,
    uncertainty,
  } = record;
  const moves = record.moves.map(({ no, session, positions }) => ({ no, ...present({ session }), positions }));
  const optional = present({ freeboardMarks, hydrometers, previous, settings, uncertainty });
  return { hydrostatics, draftMarks, stations, weights, moves, tanks, aboard, items, ...optional };
}

function rowsOf(db: Database, test: string) {
  const series = db.select().from(planSeries).where(eq(planSeries.test, test)).orderBy(asc(planSeries.place)).all();
  const stations = db.select().from(planStations).where(eq(planStations.test, test)).orderBy(asc(planStations.place)).all();
  const weights = db.select().from(planWeights).where(eq(planWeights.test, test)).orderBy(asc(planWeights.place)).all();
  const moves = db.select().from(planMoves).where(eq(planMoves.test, test)).orderBy(asc(planMoves.place)).all();
  const aboard = db.select().from(planAboard).where(eq(planAboard.test, test)).orderBy(asc(planAboard.place)).all();
  const items = db.select().from(planItems).where(eq(planItems.test, test)).orderBy(asc(planItems.place)).all();
  const hydrometers = db.select().from(planHydrometers).where(eq(planHydrometers.test, test)).orderBy(asc(planHydrometers.place)).all();
  return {
    stations: stations.map((row) => stationFromRow(row, series)),
    weights: weights.map(weightFromRow),
    moves: moves.map(moveFromRow),
    aboard: aboard.map(aboardFromRow),
    items: items.map(itemFromRow),
    ...some("hydrometers", hydrometers.map(hydrometerFromRow)),
  };
}

type Named = { readonly path: string; readonly names: readonly string[] };

function planRefusal(db: Database, test: Test, plan: Plan): PlanRefusal | null {
  const twice = namedParts(plan).flatMap(({ path, names }) =>
    names.filter((name, i) => names.indexOf(name) < i).map((name) => ({ path, name })),
  );
  if (twice[0]) return twice[0].path === "moves" ? moveTwice(twice[0].name) : { type: "NameTwice", ...twice[0] };
  if (test.state === "planning") return null;
  const kept = new Map(namedParts(plan).map(({ path, names }) => [path, new Set(names)]));
  const gone = namedParts(planRecord(db, test.id)).flatMap(({ path, names }) =>
    names.filter((name) => !kept.get(path)?.has(name)).map((name) => ({ path, name })),
  );
  return gone[0] ? { type: "NameInUse", ...gone[0] } : null;
}

function moveTwice(name: string): PlanRefusal {
  return { type: "MoveTwice", move: Number(name), path: "moves" };
}

function namedParts(
  plan: Pick<Plan, "stations" | "weights" | "moves" | "draftMarks" | "freeboardMarks" | "tanks" | "hydrometers">,
): Named[] {
  const { stations, weights, draftMarks, freeboardMarks = [], tanks, hydrometers = [], moves } = plan;
  const lists = Object.entries({ stations, weights, draftMarks, freeboardMarks, tanks, hydrometers });
  const named = lists.map(([path, list]) => ({ path, names: list.map(({ id }) => id) }));
  return [...named, { path: "moves", names: moves.map(({ no }) => String(no)) }];
}

/** The parts of one plan that stand otherwise in another: what the ledger keeps of a change. */
function changedParts(plan: Plan, other: Plan): Partial<Plan> {
  const parts = Object.keys(planSchema.shape) as (keyof Plan)[];
  const changed = parts.filter((part) => canonicalJson(plan[part] ?? null) !== canonicalJson(other[part] ?? null));
  return Object.fromEntries(changed.map((part) => [part, plan[part] ?? null]));
}
