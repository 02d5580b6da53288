import { randomUUID } from "node:crypto";
import { expect, test } from "vitest";
import { skerryTern } from "@/db/seed/skerry-tern";
import { ledgerOf } from "@/db/server/ledger-entries";
import { sheetWords } from "@/db/server/sheet-words";
import { type Plan, planOf, planRecord, savePlan } from "@/db/server/test-plan";
import { changeState } from "@/db/server/tests";
import { vesselById } from "@/db/server/vessels";
import { testRecordSchema } from "@/lib/record/test-record";
import { promised } from "@/lib/result";
import { at, plan, type Yard, yard } from "./yard";

const act = { by: null, at };

const manifold: Plan = {
  ...plan,
  stations: [
    { id: "A", instrument: "pendulum", length: 4, x: 12, reversed: true, series: [{ no: 2, length: 3.98 }, { no: 3 }] },
    { id: "U", instrument: "u-tube", span: 9, series: [{ no: 2, span: 8.9 }] },
    { id: "I", instrument: "inclinometer", reversed: false, series: [{ no: 2 }] },
  ],
  moves: [{ no: 0, session: 1, positions: plan.moves[0]?.positions ?? {} }],
  freeboardMarks: [{ id: "F1", x: 10, y: 6, deckEdge: 5.4 }],
  settings: { method: "classical", seed: 3, agreement: { battenMm: 3, degrees: 0.02, draft: 0.02, sounding: 0.01, density: 0.0005 } },
  uncertainty: { draft: 0.004 },
};

test("gives a plan back as it was saved, whatever it holds", () => {
  const { db, test: id } = yard();
  for (const given of [manifold, plan]) {
    promised(savePlan(db, id, given, null, act));
    expect(planOf(planRecord(db, id))).toEqual(given);
    expect(testRecordSchema.parse(planRecord(db, id)).test.title).toBe("Inclining test");
  }
});

test("keeps the words for readers when a plan is saved without any", () => {
  const { db, test: id } = yard();
  const words = {
    stations: { A: { where: "shaft tunnel", scale: [0, 600] as [number, number] }, B: {}, C: {}, U: {} },
    marks: { AP: "aft, port" },
    moves: { 1: "W1 to starboard" },
    water: [{ place: "aft", depth: 1 }],
    rounds: ["before" as const],
    gasDangerous: ["FO-P"],
  };
  promised(savePlan(db, id, plan, words, act));
  promised(savePlan(db, id, plan, null, act));
  expect(sheetWords(db, id)).toEqual(words);
});

test("changes the test's copy of the vessel and leaves the office's vessel alone", () => {
  const { db, test: id, vessel } = yard();
  promised(savePlan(db, id, { ...plan, draftMarks: plan.draftMarks.slice(1) }, null, act));
  expect(planRecord(db, id).draftMarks).toHaveLength(5);
  expect(vesselById(db, vessel)?.draftMarks).toHaveLength(6);
});

test("refuses a name or a move that stands twice", () => {
  const { db, test: id } = yard();
  const twice = { ...plan, weights: [...plan.weights, ...plan.weights.slice(0, 1)] };
  expect(savePlan(db, id, twice, null, act)).toEqual({ ok: false, refusal: { type: "NameTwice", path: "weights", name: "W1" } });
  const moves = [...plan.moves, ...plan.moves.slice(2, 3)];
  expect(savePlan(db, id, { ...plan, moves }, null, act)).toEqual({ ok: false, refusal: { type: "MoveTwice", path: "moves", move: 2 } });
});

test("refuses to take a name away once readings may stand on it, and lets more be added", () => {
  const { db, test: id } = yard();
  promised(changeState(db, id, "open", act));
  expectInUse({ db, test: id }, { ...plan, stations: plan.stations.slice(1) }, "stations", "A");
  expectInUse({ db, test: id }, { ...plan, moves: plan.moves.slice(0, -1) }, "moves", "8");
  expectInUse({ db, test: id }, { ...plan, tanks: plan.tanks.slice(1) }, "tanks", "FW-P");
  const more = { ...plan, stations: [...plan.stations, { id: "I", instrument: "inclinometer" as const }] };
  expect(savePlan(db, id, more, null, act).ok).toBe(true);
});

test("writes into the ledger the parts that changed and no others", () => {
  const { db, test: id } = yard();
  promised(savePlan(db, id, { ...plan, aboard: [] }, null, act));
  const entry = ledgerOf(db, id).at(-1);
  expect(entry).toMatchObject({ what: "plan.save", after: { aboard: [] } });
  expect(Object.keys(entry?.before as object)).toEqual(["aboard"]);
});

test("refuses the plan of a test that is not here", () => {
  const { db } = yard();
  const nobody = randomUUID();
  expect(savePlan(db, nobody, plan, null, act)).toEqual({ ok: false, refusal: { type: "TestUnknown", test: nobody } });
  expect(skerryTern().record.stations).toEqual(plan.stations);
});

function expectInUse({ db, test: id }: Pick<Yard, "db" | "test">, given: Plan, path: string, name: string): void {
  expect(savePlan(db, id, given, null, act)).toEqual({ ok: false, refusal: { type: "NameInUse", path, name } });
}
