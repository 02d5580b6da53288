import { describe, expect, it } from "vitest";
import { commonLine } from "@/lib/inclining/common-line";
import { type Hint, plotHints } from "@/lib/inclining/plot-hints";
import { promised } from "@/lib/result";
import { eightMovements, lineOff, mirroredLine, type OffLine, sampleSlope } from "./sample-line";

/** Scatter too small to matter, different at each reading. */
const scatter = (move: number, station: number) => 2e-6 * Math.sin(1 + 5 * move + 13 * station);

const bends: Readonly<Record<string, OffLine>> = {
  "free-liquid": (_, __, moment) => (0.08 * sampleSlope * moment * Math.abs(moment)) / 200,
  restraint: (_, __, moment) => -0.5 * sampleSlope * Math.max(0, moment - 50),
  "steady-wind": (move) => (move >= 6 ? -8e-4 : 0),
  gust: (move) => (move === 3 ? 9e-4 : 0),
  misread: (move, station) => (move === 5 && station === 1 ? 0.002 : 0),
};

function hintsOf(cause: string, stations = 3): readonly Hint[] {
  const bend = bends[cause] as OffLine;
  return plotHints(lineOff((move, j, moment) => bend(move, j, moment) + scatter(move, j), stations));
}

describe("hints of a plot", () => {
  it.each([
    ["free-liquid", [2, 6]],
    ["restraint", [1, 2, 3]],
    ["steady-wind", [6, 7, 8]],
    ["gust", [3]],
    ["misread", [5]],
  ])("name %s and the moves it touches", (cause, moves) => {
    const [first, ...others] = hintsOf(cause);
    expect(first).toMatchObject({ cause, moves, session: 1 });
    expect(first?.evidence.probability).toBeLessThan(0.002);
    expect(others).toEqual([]);
  });

  it("say how much it is, at the move it touches most", () => {
    expect(hintsOf("free-liquid")[0]?.evidence.size).toBeCloseTo(0.08 * sampleSlope * 200, 5);
    // half of 150 t·m are missing at 200 t·m, on the starboard side
    expect(hintsOf("restraint")[0]?.evidence.size).toBeCloseTo(-0.5 * sampleSlope * 150, 5);
    expect(hintsOf("steady-wind")[0]?.evidence.size).toBeCloseTo(-8e-4, 5);
    expect(hintsOf("gust")[0]?.evidence.size).toBeCloseTo(9e-4, 5);
    expect(hintsOf("gust")[0]?.evidence.share).toBeCloseTo(9e-4 / 0.02, 3);
    expect(hintsOf("misread")[0]?.evidence).toMatchObject({ size: expect.closeTo(0.002, 5), stations: ["B"] });
  });

  it("turn with the ship in a mirror", () => {
    for (const bend of Object.values(bends)) {
      const off: OffLine = (move, j, moment) => bend(move, j, moment) + scatter(move, j);
      const seen = plotHints(lineOff(off, 3));
      const mirrored = plotHints(mirroredLine(off, 3));
      expect(mirrored.map(({ cause, moves }) => [cause, moves])).toEqual(seen.map(({ cause, moves }) => [cause, moves]));
      expect(mirrored[0]?.evidence.size).toBeCloseTo(-(seen[0]?.evidence.size ?? 0), 9);
    }
  });

  it("find nothing in a straight plot, with scatter or without", () => {
    expect(plotHints(lineOff(scatter, 3))).toEqual([]);
    expect(plotHints(lineOff(() => 0, 3))).toEqual([]);
  });

  it("find nothing below the readings' own uncertainty", () => {
    const line = lineOff((move, j, moment) => (bends.gust as OffLine)(move, j, moment) + scatter(move, j), 3);
    expect(plotHints(line, 1e-3)).toEqual([]);
  });

  it("can't say which of two stations was misread", () => {
    expect(hintsOf("misread", 2)[0]).toMatchObject({ cause: "misread", moves: [5], evidence: { stations: ["A", "B"] } });
  });

  it("name both causes where the last move alone stands beyond the restraint", () => {
    const hints = plotHints(lineOff((move, j) => (move === 2 ? -9e-4 : 0) + scatter(move, j), 3));
    expect(hints.map(({ cause }) => cause)).toEqual(["gust", "restraint"]);
    expect(hints.map(({ moves }) => moves)).toEqual([[2], [2]]);
  });

  it("are the same where every batten grows to port", () => {
    const off: OffLine = (move, j, moment) => (bends["free-liquid"] as OffLine)(move, j, moment) + scatter(move, j);
    const series = [0, 1, 2].map((j) => ({
      id: `${j}`,
      series: 1,
      session: 1,
      tangents: eightMovements.map((moment, move) => ({ move, tan: -(sampleSlope * moment + off(move, j, moment)), uncertainty: 0 })),
    }));
    const moments = eightMovements.map((moment, no) => ({ no, session: 1, moment }));
    expect(plotHints(promised(commonLine(series, moments)))[0]).toMatchObject({ cause: "free-liquid", moves: [2, 6] });
  });

  it("wait for five moves", () => {
    expect(plotHints(lineOff((move) => (move === 2 ? 0.01 : 0), 1, [0, 100, 200, 0]))).toEqual([]);
  });
});
