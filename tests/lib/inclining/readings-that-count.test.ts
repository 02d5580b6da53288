import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { readingsThatCount } from "@/lib/inclining/readings-that-count";
import type { BattenReading, TestReadings } from "@/lib/inclining/test-readings";
import { sampleMoves, sampleTest } from "./sample-test";

const look = (id: string, changes: Partial<BattenReading> = {}): BattenReading =>
  ({ id, move: 1, station: "A", mode: "settled", valuesMm: [1], ...changes }) as BattenReading;

function counted(readings: Partial<TestReadings>, moves = sampleMoves) {
  const { readings: none } = sampleTest();
  return readingsThatCount(sampleTest({ moves, readings: { ...none, battens: [], drafts: [], water: [], ...readings } }));
}

const idsOf = (slots: readonly (readonly { value: { id: string } }[])[]) => slots.map((looks) => looks.map(({ value }) => value.id));

describe("readings that count", () => {
  it("are accepted ones; where nothing is said they are", () => {
    const battens = [
      look("1"),
      look("2", { status: "superseded" }),
      look("3", { status: "void" }),
      look("4", { status: "disagrees" }),
      look("5", { status: "quarantined" }),
      look("6", { status: "accepted" }),
    ];
    expect(idsOf(counted({ battens }).battens)).toEqual([["1", "6"]]);
  });

  it("keep their place in the record", () => {
    const battens = [look("1", { status: "void" }), look("2")];
    expect(counted({ battens }).battens[0]?.[0]?.path).toBe("readings.battens[1]");
  });

  it("by radio or on paper only while the station's own is absent", () => {
    const battens = [look("1", { source: "radio" }), look("2"), look("3", { source: "paper", station: "B" })];
    expect(idsOf(counted({ battens }).battens)).toEqual([["2"], ["3"]]);
  });

  it("are of the last repeat of a move", () => {
    const again = { ...sampleMoves[1], no: 1, repeat: 2, positions: {} };
    const battens = [look("1"), look("2", { repeat: 2 })];
    expect(idsOf(counted({ battens }, [...sampleMoves, again]).battens)).toEqual([["2"]]);
    expect(idsOf(counted({ battens }).battens)).toEqual([["2"]]);
  });

  it("are none while the last repeat has none yet", () => {
    const again = { no: 1, repeat: 2, positions: {} };
    expect(counted({ battens: [look("1")] }, [...sampleMoves, again]).battens).toEqual([]);
  });

  it("leave out a move whose last repeat is excluded, but not one whose earlier run was", () => {
    const excluded = sampleMoves.map((move) => (move.no === 1 ? { ...move, excluded: "gust" } : move));
    expect(counted({ battens: [look("1")] }, excluded).battens).toEqual([]);
    expect(idsOf(counted({ battens: [look("1"), look("2", { repeat: 2 })] }, excluded).battens)).toEqual([["2"]]);
  });

  it("are of the round before where both exist, of the round after where it alone does", () => {
    const draft = (id: string, mark: string, round: "before" | "after") => ({ id, mark, round, value: 2 });
    expect(idsOf(counted({ drafts: [draft("1", "AP", "after"), draft("2", "AP", "before")] }).drafts)).toEqual([["2"]]);
    expect(idsOf(counted({ drafts: [draft("1", "AP", "after")] }).drafts)).toEqual([["1"]]);
  });

  it("never mix the rounds of the marks, but take each tank's own first round", () => {
    const drafts = [
      { id: "1", mark: "AP", round: "before" as const, value: 2 },
      { id: "2", mark: "AS", round: "after" as const, value: 2 },
    ];
    const soundings = [
      { id: "3", tank: "FW", round: "before" as const, value: 1 },
      { id: "4", tank: "FO", round: "after" as const, value: 1 },
    ];
    const result = counted({ drafts, soundings });
    expect(idsOf(result.drafts)).toEqual([["1"]]);
    expect(idsOf(result.soundings)).toEqual([["3"], ["4"]]);
  });

  it("tell soundings of moves from those of rounds", () => {
    const soundings = [
      { id: "1", tank: "BW", move: 1, value: 1 },
      { id: "2", tank: "BW", round: "before" as const, value: 1 },
    ];
    const result = counted({ soundings });
    expect(idsOf(result.ballast)).toEqual([["1"]]);
    expect(idsOf(result.soundings)).toEqual([["2"]]);
  });

  it("keep series, sessions and stations apart", () => {
    const moves = [...sampleMoves, { no: 7, session: 2, positions: {} }];
    const battens = [look("1"), look("2", { series: 2 }), look("3", { move: 7, session: 2 }), look("4", { station: "B" })];
    expect(idsOf(counted({ battens }, moves).battens)).toEqual([["1"], ["2"], ["3"], ["4"]]);
  });

  it("are the same in any order of the record", () => {
    const battens = [look("1"), look("2", { move: 2 }), look("3", { source: "radio" }), look("4", { station: "B" })];
    fc.assert(
      fc.property(fc.shuffledSubarray(battens, { minLength: 4 }), (shuffled) => {
        const sorted = idsOf(counted({ battens: shuffled }).battens)
          .flat()
          .sort();
        expect(sorted).toEqual(["1", "2", "4"]);
      }),
    );
  });
});
