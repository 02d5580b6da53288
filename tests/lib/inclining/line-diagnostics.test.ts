import { describe, expect, it } from "vitest";
import { stationAgreement, withoutEachMove, zeroDrift } from "@/lib/inclining/line-diagnostics";
import { eightMovements, lineOff, mirroredLine, sampleSlope } from "./sample-line";

const ship = { displacement: 5000, gmFluid: 2 };

describe("a line without one of its moves", () => {
  it("changes nothing where the line is straight", () => {
    for (const { slopeChange, gmFluid } of withoutEachMove(
      lineOff(() => 0),
      ship,
    )) {
      expect(slopeChange).toBeCloseTo(0, 12);
      expect(gmFluid).toBeCloseTo(2, 12);
    }
  });

  it("is the straight one again when the move that stands off is left out", () => {
    const line = lineOff((move) => (move === 2 ? 0.002 : 0));
    const without = withoutEachMove(line, ship);
    // off by 0.002 at 200 of Σ M² = 120 000
    const bent = sampleSlope + (0.002 * 200) / 120_000;
    expect(line.slope).toBeCloseTo(bent, 14);
    expect(without[2]?.slopeChange).toBeCloseTo(sampleSlope / bent - 1, 10);
    expect(without[2]?.gmFluid).toBeCloseTo(2 + (1 / sampleSlope - 1 / bent) / 5000, 10);
    const others = without.filter(({ no }) => no !== 2).map(({ slopeChange }) => Math.abs(slopeChange));
    expect(Math.max(...others)).toBeLessThan(Math.abs(without[2]?.slopeChange ?? 0));
  });

  it("is left out of the list where it takes the line with it", () => {
    expect(
      withoutEachMove(
        lineOff(() => 0, 1, [0, 100]),
        ship,
      ),
    ).toEqual([]);
  });

  it("changes alike in a mirror", () => {
    const off = (move: number) => Math.sin(move) * 1e-4;
    const seen = withoutEachMove(lineOff(off), ship);
    withoutEachMove(mirroredLine(off), ship).forEach(({ slopeChange }, i) => {
      expect(slopeChange).toBeCloseTo(seen[i]?.slopeChange as number, 12);
    });
  });
});

describe("stations against the common line", () => {
  it("show by how much one heels less than the others", () => {
    const line = lineOff((_, j, moment) => (j === 1 ? -0.1 * sampleSlope * moment : 0));
    const [a, b] = stationAgreement(line);
    expect(a?.slopeDeviation).toBeCloseTo(1 / 0.95 - 1, 12);
    expect(b?.slopeDeviation).toBeCloseTo(0.9 / 0.95 - 1, 12);
    expect([a?.hasSense, b?.hasSense]).toEqual([true, true]);
  });

  it("show a bob that goes the other way", () => {
    const line = lineOff((_, j, moment) => (j === 2 ? -2 * sampleSlope * moment : 0), 3);
    expect(stationAgreement(line).map(({ id, hasSense }) => [id, hasSense])).toEqual([
      ["A", true],
      ["B", true],
      ["C", false],
    ]);
  });

  it("can't be compared while a station has no line of its own", () => {
    expect(stationAgreement(lineOff(() => 0, 2, [0, 100]))).toEqual([]);
  });
});

describe("drift of zero", () => {
  it("is the last zero less the first, station by station", () => {
    const drifts = zeroDrift(lineOff((move, j) => (j === 1 ? 0.0001 * move : 0)));
    expect(drifts.map(({ id, from, to }) => [id, from, to])).toEqual([
      ["A", 0, 8],
      ["B", 0, 8],
    ]);
    expect(drifts.map(({ drift }) => drift)).toEqual([expect.closeTo(0, 12), expect.closeTo(0.0008, 12)]);
  });

  it("leaves out what a last moment that is not quite zero heels her", () => {
    const moments = [...eightMovements.slice(0, 8), 1.5];
    expect(zeroDrift(lineOff(() => 0, 1, moments))[0]?.drift).toBeCloseTo(0, 12);
  });

  it("is not known of a test with one zero", () => {
    expect(zeroDrift(lineOff(() => 0, 2, [0, 100, 200, -100]))).toEqual([]);
  });
});
