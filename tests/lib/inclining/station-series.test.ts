import { describe, expect, it } from "vitest";
import { readingsThatCount } from "@/lib/inclining/readings-that-count";
import { stationSeries } from "@/lib/inclining/station-series";
import type { Station } from "@/lib/inclining/test-plan";
import type { BattenReading } from "@/lib/inclining/test-readings";
import { promised } from "@/lib/result";
import { sampleTest } from "./sample-test";

const upright = { tanHeel: 0, zeroMoves: () => [0, 3] };
const pendulum: Station = { id: "A", instrument: "pendulum", length: 4, series: [{ no: 2, length: 5 }] };
const inclinometer: Station = { id: "I", instrument: "inclinometer" };
const settled = (move: number, mm: number, changes: Partial<BattenReading> = {}) =>
  ({ id: `${move} ${mm}`, move, station: "A", mode: "settled", valuesMm: [mm], ...changes }) as BattenReading;
const angle = (move: number, degrees: number) =>
  ({ id: `${move}`, move, station: "I", mode: "settled", valuesDegrees: [degrees] }) as BattenReading;

function seriesOf(battens: BattenReading[], stations = [pendulum, inclinometer], uncertainty = { readingMm: 0, readingDegrees: 0 }) {
  const test = sampleTest({ stations, readings: { ...sampleTest().readings, battens } });
  return stationSeries(stations, readingsThatCount(test).battens, upright, uncertainty);
}

describe("series of a station", () => {
  it("has a tangent for each move it has read", () => {
    const [series] = promised(seriesOf([settled(0, 40), settled(2, 80)]));
    expect(series).toMatchObject({ id: "A", series: 1, session: 1 });
    expect(series?.tangents.map(({ move, tan }) => [move, tan])).toEqual([
      [0, 0.01],
      [2, 0.02],
    ]);
  });

  it("begins anew with a new length", () => {
    const all = promised(seriesOf([settled(0, 40), settled(1, 100, { series: 2 })]));
    expect(all.map(({ series, tangents }) => [series, tangents[0]?.tan])).toEqual([
      [1, 0.01],
      [2, 0.02],
    ]);
  });

  it("takes several looks as their mean, surer by the root of their number", () => {
    const [series] = promised(seriesOf([settled(0, 40), settled(0, 44)], [pendulum], { readingMm: 1, readingDegrees: 0 }));
    expect(series?.tangents[0]?.tan).toBeCloseTo(0.0105, 15);
    expect(series?.tangents[0]?.uncertainty).toBeCloseTo(1 / 4000 / Math.SQRT2, 15);
  });

  it("of an inclinometer counts from move 0, else from the first move that stands as at zero", () => {
    const [atZero] = promised(seriesOf([angle(1, 2), angle(0, 0.5)]));
    expect(atZero?.tangents.find(({ move }) => move === 1)?.tan).toBeCloseTo(Math.tan((1.5 * Math.PI) / 180), 14);
    const [later] = promised(seriesOf([angle(1, 2), angle(3, 0.5)]));
    expect(later?.tangents.find(({ move }) => move === 1)?.tan).toBeCloseTo(Math.tan((1.5 * Math.PI) / 180), 14);
  });

  it("refuses an inclinometer that was never read at zero, with its place", () => {
    const refused = seriesOf([angle(1, 2)]);
    expect(refused).toMatchObject({ ok: false, refusal: { faults: [{ type: "NoZeroReading", station: "I", path: "stations[1]" }] } });
  });

  it("refuses everything that is wrong at once, each with its place", () => {
    const broken: BattenReading[] = [
      settled(0, 1, { station: "Z" }),
      { id: "t", move: 1, station: "A", mode: "turning-points", valuesMm: [1, 2] },
      settled(0, 1, { station: "I" }),
    ];
    const refused = seriesOf(broken);
    expect(refused).toMatchObject({
      ok: false,
      refusal: {
        faults: [
          { type: "UnknownStation", station: "Z", path: "readings.battens[0].station" },
          { type: "TooFewTurningPoints", got: 2, path: "readings.battens[1].valuesMm" },
          { type: "WrongKindOfValue", instrument: "inclinometer", path: "readings.battens[2]" },
        ],
      },
    });
  });

  it("refuses a length of zero once, however many moves it has read", () => {
    const refused = seriesOf([settled(0, 1), settled(1, 2)], [{ id: "A", instrument: "pendulum", length: 0 }]);
    expect(refused).toMatchObject({ ok: false, refusal: { faults: [{ type: "ZeroLength", path: "stations[0].length" }] } });
  });
});
