import { describe, expect, it } from "vitest";
import { schemaFaults } from "@/lib/record/schema-faults";
import { testRecordSchema } from "@/lib/record/test-record";
import { documentWith } from "./sample-document";

function faultsOf(path: readonly (string | number)[], value: unknown) {
  const document = documentWith(path, value);
  const shaped = testRecordSchema.safeParse(document);
  return shaped.success ? [] : schemaFaults(document, shaped.error.issues);
}

describe("faults of shape", () => {
  it("say what is needed and what is given", () => {
    expect(faultsOf(["vessel", "lbp"], -54)).toEqual([
      { type: "NotAsNeeded", needed: "a number above 0", given: "-54", path: "vessel.lbp" },
    ]);
    expect(faultsOf(["draftMarks", 2, "zero"], null)).toEqual([
      { type: "NotAsNeeded", needed: "a number", given: "null", path: "draftMarks[2].zero" },
    ]);
    expect(faultsOf(["moves", 1, "positions", "W1"], [1, 2])).toEqual([
      { type: "NotAsNeeded", needed: "at least 3 entries", given: "2 entries", path: "moves[1].positions.W1" },
    ]);
    expect(faultsOf(["stations"], undefined)).toEqual([{ type: "NotAsNeeded", needed: "an array", given: "nothing", path: "stations" }]);
    expect(faultsOf(["stations", 0, "instrument"], "clock")).toEqual([
      { type: "NotAsNeeded", needed: '"pendulum" or "u-tube" or "inclinometer"', given: '"clock"', path: "stations[0].instrument" },
    ]);
    expect(faultsOf(["test", "date"], "4 May")).toEqual([
      { type: "NotAsNeeded", needed: "a date such as 2026-05-04", given: '"4 May"', path: "test.date" },
    ]);
  });

  it("name an unknown key at its own place", () => {
    expect(faultsOf(["vessel", "colour"], "red")).toEqual([{ type: "UnknownKey", key: "colour", path: "vessel.colour" }]);
    expect(faultsOf(["readings", "battens", 4, "valueMm"], 5)).toEqual([
      { type: "UnknownKey", key: "valueMm", path: "readings.battens[4].valueMm" },
    ]);
  });

  it("of a reading are those of the shape it comes nearest to", () => {
    expect(faultsOf(["readings", "battens", 0, "valuesMm"], [1, "two", 3])).toEqual([
      { type: "NotAsNeeded", needed: "a number", given: '"two"', path: "readings.battens[0].valuesMm[1]" },
    ]);
    expect(faultsOf(["readings", "battens", 3, "portMm"], undefined)).toEqual([
      { type: "NotAsNeeded", needed: "an array", given: "nothing", path: "readings.battens[3].portMm" },
    ]);
    expect(faultsOf(["readings", "battens", 0, "valuesMm"], undefined)).toEqual([
      {
        type: "NotAsNeeded",
        needed: "one of valuesMm, portMm and starboardMm, valuesDegrees",
        given: "an object",
        path: "readings.battens[0]",
      },
    ]);
  });
});
