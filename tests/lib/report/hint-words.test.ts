import { describe, expect, it } from "vitest";
import type { Hint, HintCause } from "@/lib/inclining/plot-hints";
import { hintAdvice, hintEvidence, hintName, movesInWords } from "@/lib/report/hint-words";

function hint(cause: HintCause, size: number, moves: readonly number[], stations: readonly string[] = []): Hint {
  return { cause, session: 1, moves, evidence: { size, share: size / 0.02, probability: 0.0004, stations } };
}

describe("the words of a hint", () => {
  it.each([
    [hint("free-liquid", 0.0016, [2, 6]), "more heel per moment as the moment grows: 8.0 % more at the largest", "repeat moves 2 and 6"],
    [hint("restraint", -0.004, [2]), "the plot flattens to starboard: 20.0 % of the largest heel is missing at its end", "repeat move 2"],
    [
      hint("restraint", 0.004, [5, 6, 7]),
      "the plot flattens to port: 20.0 % of the largest heel is missing at its end",
      "moves 5, 6 and 7",
    ],
    [hint("steady-wind", -0.0008, [6, 7, 8]), "−0.80 mm per m from move 6 on, alike at every moment", "read zero again"],
    [hint("gust", 0.0009, [3]), "+0.90 mm per m at this move only, at all stations", "Repeat move 3"],
    [hint("misread", 0.002, [5], ["A", "B"]), "station A or B stands +2.00 mm per m from the other stations", "repeat move 5"],
  ])("$cause", (found, evidence, advice) => {
    expect(hintEvidence(found)).toBe(`${evidence}; scatter alone shows as much in 4 of 10 000 cases`);
    expect(hintAdvice(found)).toContain(advice);
    expect(hintName(found.cause)).toMatch(/^[A-Z]/);
  });

  it("name moves as one speaks of them", () => {
    expect([[3], [2, 6], [1, 2, 3]].map(movesInWords)).toEqual(["move 3", "moves 2 and 6", "moves 1, 2 and 3"]);
  });

  it("name the session after the first", () => {
    expect(hintEvidence({ ...hint("gust", 0.001, [1]), session: 2 })).toMatch(/^session 2: /);
  });

  it("don't print a chance that has no digits left", () => {
    const { evidence, ...rest } = hint("gust", 0.001, [1]);
    expect(hintEvidence({ ...rest, evidence: { ...evidence, probability: 1e-9 } })).toContain("fewer than 1 of 10 000 cases");
  });
});
