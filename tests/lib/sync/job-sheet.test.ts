import { describe, expect, it } from "vitest";
import { jobSheetSchema } from "@/lib/sync/job-sheet";
import { people, testId } from "./sample-acts";

const station = { id: "A", instrument: "pendulum", place: "Frame 20", length: 4, scale: [-300, 300], series: 1 };
const sheet = {
  format: "battenbook-job",
  tag: "tag",
  test: { id: testId, title: "Inclining test", date: "2026-05-04", place: "Quay", timeZone: "Europe/Oslo", state: "open" },
  vessel: { name: "MV Skerry Tern", lbp: 60 },
  person: { id: people.reader, name: "Ann", roles: ["reader"] },
  stations: [station, { id: "I", instrument: "inclinometer", place: null, length: null, scale: [-10, 10], series: 2 }],
  weights: [{ id: "W1" }],
  moves: [{ no: 0, label: "Reference", repeat: 1, state: "closed" }],
  draftMarks: [{ id: "AP", place: "Aft, port" }],
  freeboardMarks: [],
  tanks: [{ id: "FO1", contents: "Fuel oil", measure: "sounding", gasDangerous: false, shifts: false }],
  water: [{ place: "midships", depth: 1 }],
  hydrometers: ["H1"],
  rounds: ["before", "after"],
  issuedAt: "2026-05-04T07:00:00.000Z",
};

describe("a job sheet", () => {
  it("is read as it was written", () => {
    expect(jobSheetSchema.parse(JSON.parse(JSON.stringify(sheet)))).toEqual(sheet);
  });

  it.each<[string, object]>([
    ["anybody's readings", { readings: [] }],
    ["a prediction", { predictions: [] }],
    ["the moment of a weight, from which a heel could be reckoned", { weights: [{ id: "W1", mass: 10 }] }],
    ["a move's positions", { moves: [{ ...sheet.moves[0], positions: {} }] }],
    ["a value of a mark", { draftMarks: [{ ...sheet.draftMarks[0], value: 2 }] }],
    ["a value at a station", { stations: [{ ...station, valuesMm: [100] }] }],
  ])("has no room for %s: readers read blind", (_, changes) => {
    expect(jobSheetSchema.safeParse({ ...sheet, ...changes }).success).toBe(false);
  });

  it.each<[string, object]>([
    ["of another format", { format: "battenbook-record" }],
    ["of a test in no state", { test: { ...sheet.test, state: "running" } }],
    ["of a ship without length", { vessel: { name: "MV Skerry Tern", lbp: 0 } }],
    ["for a person of an unknown role", { person: { ...sheet.person, roles: ["captain"] } }],
    ["with an instrument nobody knows", { stations: [{ ...station, instrument: "sextant" }] }],
    ["with half a scale", { stations: [{ ...station, scale: [-300] }] }],
    ["with a move in a state it can't be in on a phone", { moves: [{ ...sheet.moves[0], state: "disagrees" }] }],
  ])("is refused %s", (_, changes) => {
    expect(jobSheetSchema.safeParse({ ...sheet, ...changes }).success).toBe(false);
  });
});
