import { randomUUID } from "node:crypto";
import { expect, test } from "vitest";
import { jobSheetOf } from "@/db/server/job-sheet";
import { savePlan } from "@/db/server/test-plan";
import { changeState } from "@/db/server/tests";
import { promised } from "@/lib/result";
import { jobSheetSchema } from "@/lib/sync/job-sheet";
import { at, hoursLater, personWith, plan, yard } from "./yard";

const act = { by: null, at };
const words = {
  stations: { A: { where: "shaft tunnel", scale: [0, 600] as [number, number] } },
  marks: { AP: "aft, port quarter" },
  moves: { 1: "W1 to starboard" },
  water: [{ place: "aft", depth: 1 }],
  rounds: ["before" as const, "after" as const],
};

function issued() {
  const here = yard();
  promised(savePlan(here.db, here.test, plan, words, act));
  const reader = personWith(here, "reader");
  const sheet = (moment = at) => jobSheetOf(here.db, here.test, reader.id, moment) ?? expect.fail("no sheet");
  return { ...here, reader, sheet };
}

test("tells a reader what to read, where and on which scale, in the words of the plan", () => {
  const { sheet, reader } = issued();
  const { sheet: read } = sheet();
  expect(jobSheetSchema.parse(read)).toEqual(read);
  expect(read.person).toEqual({ id: reader.id, name: "A reader", roles: ["reader"] });
  expect(read.stations[0]).toEqual({ id: "A", instrument: "pendulum", place: "shaft tunnel", length: 4.1, scale: [0, 600], series: 1 });
  expect(read.stations[3]).toMatchObject({ id: "U", place: null, length: 9.6, scale: [0, 2000] });
  expect(read.moves[1]).toEqual({ no: 1, label: "W1 to starboard", repeat: 1, state: "due" });
  expect(read.draftMarks.slice(0, 2)).toEqual([
    { id: "AP", place: "aft, port quarter" },
    { id: "AS", place: "aft, starboard" },
  ]);
});

test("warns of every tank that holds something else than clean water, unless the plan knows better", () => {
  const { sheet, db, test: id } = issued();
  const dangerous = () =>
    sheet()
      .sheet.tanks.filter(({ gasDangerous }) => gasDangerous)
      .map(({ id }) => id);
  expect(dangerous()).toEqual(["FO-P", "FO-S", "FO-D", "LO", "GW"]);
  promised(savePlan(db, id, plan, { ...words, gasDangerous: ["FO-D"] }, act));
  expect(dangerous()).toEqual(["FO-D"]);
});

test("keeps its tag while the plan stands, and its ETag while nothing changes but the time", () => {
  const { sheet, db, test: id } = issued();
  const first = sheet();
  expect(sheet(hoursLater(1)).etag).toBe(first.etag);
  promised(changeState(db, id, "open", act));
  const opened = sheet();
  expect(opened.sheet.tag).toBe(first.sheet.tag);
  expect(opened.etag).not.toBe(first.etag);
  promised(savePlan(db, id, { ...plan, stations: [...plan.stations, { id: "I", instrument: "inclinometer" }] }, words, act));
  expect(sheet().sheet.tag).not.toBe(first.sheet.tag);
});

test("has the same tag for everybody, and each his own name", () => {
  const { sheet, db, test: id } = issued();
  const other = personWith({ db, test: id }, "lead", "Liv");
  const theirs = jobSheetOf(db, id, other.id, at);
  expect(theirs?.sheet.tag).toBe(sheet().sheet.tag);
  expect(theirs?.sheet.person.name).toBe("Liv");
});

test("holds no positions, masses, readings or predictions", () => {
  const { sheet } = issued();
  expect(sheet().sheet.weights).toEqual(plan.weights.map(({ id }) => ({ id })));
  expect(Object.keys(sheet().sheet.moves[1] ?? {}).sort()).toEqual(["label", "no", "repeat", "state"]);
});

test("is nothing for a test or a person that is not here", () => {
  const { db, test: id, reader } = issued();
  expect(jobSheetOf(db, randomUUID(), reader.id, at)).toBeNull();
  expect(jobSheetOf(db, id, randomUUID(), at)).toBeNull();
});
