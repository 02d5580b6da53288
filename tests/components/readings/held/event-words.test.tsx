import { describe, expect, test } from "vitest";
import { actWords, stateWords, valueWords } from "@/components/readings/held/event-words";
import type { EventBody } from "@/lib/sync/event";

const record: EventBody = {
  v: 1,
  id: "019a0000-0000-7000-8000-000000000001",
  device: "5b3f2c1e-0a4d-4b8e-9c55-6f0a1d2e3c41",
  seq: 1,
  test: "5b3f2c1e-0a4d-4b8e-9c55-6f0a1d2e3c42",
  jobTag: "tag",
  author: "5b3f2c1e-0a4d-4b8e-9c55-6f0a1d2e3c43",
  capturedAt: "2026-05-04T09:12:31.250Z",
  clockOffsetMs: null,
  reason: null,
  type: "record",
  reading: "5b3f2c1e-0a4d-4b8e-9c55-6f0a1d2e3c44",
  base: null,
  slot: { kind: "batten", move: 3, repeat: 2, station: "A", series: 1 },
  payload: { mode: "turning-points", valuesMm: [112, 97, 110] },
  source: "station",
};

describe("the words of an event", () => {
  test.each([
    ["saved", "Saved on this phone, not sent yet"],
    ["sending", "Sending now"],
    ["on-server", "On the server"],
    ["confirmed", "Confirmed: in a backup or the report"],
  ] as const)("say of %s where it is", (state, words) => {
    expect(stateWords(state, null)).toBe(words);
  });

  test("say why the server set it aside", () => {
    const receipt = {
      id: record.id,
      outcome: "quarantined",
      serverSeq: 1,
      code: "unknown-slot",
      message: "no such move in the plan",
    } as const;
    expect(stateWords("quarantined", receipt)).toBe("Set aside by the server: no such move in the plan");
  });

  test("name the place and the resting point", () => {
    expect(actWords(record)).toBe("Station A, move 3, repeat 2");
    // (112 + 2 × 97 + 110) / 4
    expect(valueWords(record)).toBe("104.0 mm, 3 turning points");
  });

  test("say with how many photographs it was taken", () => {
    const name = "0".repeat(64);
    expect(actWords({ ...record, photographs: [name] })).toBe("Station A, move 3, repeat 2, with a photograph");
    expect(actWords({ ...record, photographs: [name, name] })).toBe("Station A, move 3, repeat 2, with 2 photographs");
  });

  test("name a reading that was taken back, with its reason", () => {
    const back: EventBody = { ...record, type: "void", base: record.id, payload: {}, source: null, reason: "Mistyped" };
    expect([actWords(back), valueWords(back)]).toEqual(["Station A, move 3, repeat 2, taken back", "Mistyped"]);
  });
});
