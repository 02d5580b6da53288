import { describe, expect, it } from "vitest";
import { usualLimits } from "@/lib/inclining/checks/check-limits";
import { movements, straightness, uncertaintyOfMove } from "@/lib/inclining/checks/movement-checks";
import { eightMovements, lineOff } from "../sample-line";
import { sampleTest } from "../sample-test";

const wobble = [1, -2, 1, 2, -1, 2, -1, -2, 0].map((each) => each * 2e-5);
const exact = sampleTest();
const untold = sampleTest({ uncertainty: undefined });

describe("straightness", () => {
  it("is met by a line with nothing but scatter", () => {
    const finding = straightness(
      exact,
      lineOff((move) => wobble[move] ?? 0),
      usualLimits,
    );
    expect(finding.verdict).toBe("met");
    expect(finding.limit.standardised).toBeGreaterThan(3);
    expect(finding.found.probability).toBeGreaterThan(0.05);
  });

  it("names the move that stands off", () => {
    const finding = straightness(
      exact,
      lineOff((move) => (wobble[move] ?? 0) + (move === 3 ? 8e-4 : 0)),
      usualLimits,
    );
    expect(finding).toMatchObject({ verdict: "attention", found: { move: 3 } });
    expect(finding.found.standardised).toBeGreaterThan(finding.limit.standardised ?? 0);
  });

  it("fails by lack of fit alone, where moves repeat and no single one stands off", () => {
    const bent = lineOff((move, _, moment) => 0.2 * (wobble[move] ?? 0) + 5e-9 * moment * Math.abs(moment));
    const finding = straightness(exact, bent, usualLimits);
    expect(finding.verdict).toBe("attention");
    expect(finding.found.probability).toBeLessThan(0.05);
    expect(Math.abs(finding.found.standardised ?? 0)).toBeLessThan(finding.limit.standardised ?? 0);
  });

  it("takes no scatter below the readings' own uncertainty for bent", () => {
    const off = (move: number) => (move === 3 ? 5e-5 : 0);
    expect(straightness(exact, lineOff(off), usualLimits).verdict).toBe("attention");
    expect(straightness(untold, lineOff(off), usualLimits).verdict).toBe("met");
  });

  it("is held to the probability that is set", () => {
    const limitAt = (probability: number) =>
      straightness(
        exact,
        lineOff((move) => wobble[move] ?? 0),
        { ...usualLimits, straightness: probability },
      ).limit.standardised ?? 0;
    expect(limitAt(0.01)).toBeGreaterThan(limitAt(0.05));
  });

  it("can't be told of three moves, and that is not met", () => {
    expect(
      straightness(
        exact,
        lineOff(() => 0, 2, [0, 100, -100]),
        usualLimits,
      ),
    ).toMatchObject({
      verdict: "attention",
      found: { standardised: null, move: null, probability: null },
    });
  });
});

it("readings of half a millimetre leave a move's mean over 4 m and 5 m as uncertain as their mean", () => {
  const [a, b] = [0.0005 / 4, 0.0005 / 5];
  expect(
    uncertaintyOfMove(
      untold,
      lineOff(() => 0),
    ),
  ).toBeCloseTo(Math.sqrt(a ** 2 + b ** 2) / 2, 15);
  expect(
    uncertaintyOfMove(
      exact,
      lineOff(() => 0),
    ),
  ).toBe(0);
});

describe("weight movements", () => {
  it.each([
    [8, false, "met"],
    [7, true, "met"],
    [6, true, "met"],
    [7, false, "attention"],
    [5, true, "not-met"],
  ])("%i of them, straight %s, are %s", (count, isStraight, verdict) => {
    const line = lineOff(() => 0, 1, eightMovements.slice(0, count + 1));
    expect(movements(line, isStraight, usualLimits)).toMatchObject({ verdict, found: { movements: count } });
  });
});
