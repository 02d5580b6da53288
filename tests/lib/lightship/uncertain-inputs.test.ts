import { describe, expect, test } from "vitest";
import { skerryTern, skerryTernReadings } from "@/db/seed/skerry-tern";
import { incliningResult } from "@/lib/lightship/inclining-result";
import { assumedUncertainty, statedUncertainty } from "@/lib/lightship/stated-uncertainty";
import { type Cause, uncertainInputs } from "@/lib/lightship/uncertain-inputs";
import { promised } from "@/lib/result";

const { record } = skerryTern();
const tern = { ...record, readings: skerryTernReadings(7) };
const all = uncertainInputs(tern, assumedUncertainty, { relative: 0.002, degreesOfFreedom: 7 });

function of(cause: Cause) {
  return all.filter((input) => input.cause === cause);
}

describe("shared causes are one input", () => {
  test("one for each weight, though it stands in every move", () => {
    expect(of("weights").map(({ standard }) => standard)).toEqual(record.weights.map(({ mass }) => 0.001 * mass));
  });

  test("one for each place of a weight: two places each, eight in all", () => {
    expect(of("weight-places")).toHaveLength(8);
    const shifted = of("weight-places")[0]?.shifted(tern, 0.1);
    const changed = shifted?.moves.filter((move, i) => move.positions.W1?.[1] !== tern.moves[i]?.positions.W1?.[1]);
    // W1 stands where it stood at the start in all moves but 1, 2 and 3
    expect(changed?.map(({ no }) => no)).toEqual([0, 4, 5, 6, 7, 8]);
  });

  test("one for each station, each mark read before the moves, and each sample", () => {
    expect(of("lengths")).toHaveLength(4);
    expect(of("drafts")).toHaveLength(6);
    expect(of("mark-zeros")).toHaveLength(6);
    expect(of("density")).toHaveLength(6);
  });
});

test("takes a tank sounded exactly empty or full as certain", () => {
  // FO-P and FO-S are slack; the others are pressed up or empty
  const shifted = of("soundings").map((input) =>
    input.shifted(tern, 1).readings.soundings.filter((one, i) => one !== tern.readings.soundings[i]),
  );
  expect(shifted.map((readings) => readings.map(({ tank, round }) => [tank, round]))).toEqual([[["FO-P", "before"]], [["FO-S", "before"]]]);
});

test("leaves out what is stated to be certain", () => {
  expect(uncertainInputs(tern, statedUncertainty({}), { relative: 0, degreesOfFreedom: 7 })).toEqual([]);
});

test("stretches the slope, and nothing else, with the scatter of the line", () => {
  const before = promised(incliningResult(tern));
  const [line] = of("line");
  const after = promised(incliningResult({ ...tern, ...(line?.shifted(tern, 0.01) ?? {}) }));
  expect(after.fit.slope / before.fit.slope).toBeCloseTo(1.01, 10);
  expect(after.asInclined.displacement).toBe(before.asInclined.displacement);
});

test("counts only what is stated, and assumes where nothing is", () => {
  expect(statedUncertainty({ draft: 0.003 })).toEqual({ ...statedUncertainty({}), draft: 0.003 });
  expect(statedUncertainty(undefined)).toBe(assumedUncertainty);
});
