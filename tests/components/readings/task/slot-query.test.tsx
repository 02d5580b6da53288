import { describe, expect, test } from "vitest";
import { battenSlot, conditionSlot, markSlot, slotHref, tankSlot, waterSlot } from "@/components/readings/task/slot-query";
import type { JobSheet } from "@/lib/sync/job-sheet";
import type { Slot } from "@/lib/sync/slot";

const id = "5b3f2c1e-0a4d-4b8e-9c55-6f0a1d2e3c41";
const sheet: JobSheet = {
  format: "battenbook-job",
  tag: "tag",
  test: { id, title: "Inclining test", date: "2026-05-04", place: "Outer basin", timeZone: "Europe/Oslo", state: "open" },
  vessel: { name: "MV Skerry Tern", lbp: 52 },
  person: { id, name: "A. Reader", roles: ["reader"] },
  stations: [{ id: "A & B", instrument: "pendulum", place: null, length: 4, scale: [-300, 300], series: 2 }],
  weights: [],
  moves: [{ no: 3, label: "W1 to starboard", repeat: 2, state: "open" }],
  draftMarks: [{ id: "FP", place: "stem" }],
  freeboardMarks: [{ id: "FP", place: "fore deck" }],
  tanks: [{ id: "BW3", contents: "ballast", measure: "sounding", gasDangerous: false, shifts: true }],
  water: [{ place: "midships", depth: 0.5 }],
  hydrometers: [],
  rounds: ["before", "after"],
  issuedAt: "2026-05-04T06:00:00Z",
};

const slots: [string, Slot, (query: URLSearchParams, sheet: JobSheet) => Slot | null][] = [
  ["batten", { kind: "batten", move: 3, repeat: 2, station: "A & B", series: 2 }, battenSlot],
  ["draft", { kind: "draft", mark: "FP", round: "after" }, markSlot],
  ["freeboard", { kind: "freeboard", mark: "FP", round: "before" }, markSlot],
  ["sounding", { kind: "sounding", tank: "BW3", round: "before" }, tankSlot],
  ["ballast", { kind: "ballast", tank: "BW3", move: 3 }, tankSlot],
  ["water", { kind: "water", place: "midships", depth: 0.5, round: "after" }, waterSlot],
  ["condition", { kind: "condition", move: 3 }, conditionSlot],
  ["note", { kind: "note" }, conditionSlot],
];

describe("the address of a reading due", () => {
  test.each(slots)("leads back to the same %s slot, with the test in the query", (_, slot, read) => {
    const { pathname, searchParams } = new URL(slotHref(id, slot), "https://phone.example");
    expect(pathname).toMatch(/^\/readings\/[a-z]+$/);
    expect(searchParams.get("test")).toBe(id);
    expect(read(searchParams, sheet)).toEqual(slot);
  });

  test("is nobody's where the sheet has no such station", () => {
    expect(battenSlot(new URLSearchParams("station=C&move=3"), sheet)).toBeNull();
  });
});
