import { cleanup, render, screen } from "@testing-library/react";
import { afterEach, expect, test } from "vitest";
import { LinePanel } from "@/components/control/line-panel";
import { PlotHints } from "@/components/control/plot-hints";
import type { Hint } from "@/lib/inclining/plot-hints";
import { testSoFar } from "@/lib/inclining/test-so-far";
import { bargeRecord } from "./barge";

afterEach(cleanup);

function hint(cause: Hint["cause"], moves: readonly number[]): Hint {
  return { cause, session: 1, moves, evidence: { size: -0.0012, share: -0.06, probability: 0.0002, stations: [] } };
}

test("a hint names the cause, the moves to repeat and what speaks for it", () => {
  render(<PlotHints hints={[hint("free-liquid", [2, 6])]} />);
  expect(screen.getByText("Likely: free liquid")).toBeDefined();
  expect(screen.getByText(/then repeat moves 2 and 6/)).toBeDefined();
  expect(screen.getByText(/scatter alone shows as much in 2 of 10 000 cases/)).toBeDefined();
});

test("causes that the moves can't separate are both named, and that they can't", () => {
  render(<PlotHints hints={[hint("gust", [2]), hint("restraint", [2])]} />);
  expect(screen.getAllByText(/^Likely: /)).toHaveLength(2);
  expect(screen.getByText(/tells them apart/)).toBeDefined();
});

test("the line of a barge that heels by the moment alone has nothing to hint at", () => {
  const record = bargeRecord(4);
  render(<LinePanel record={record} so={testSoFar(record)} />);
  expect(screen.queryByText(/^Likely: /)).toBeNull();
});

test("a batten misread at a move is named beside the plot", () => {
  const record = bargeRecord(4);
  const battens = record.readings.battens.map((reading) =>
    reading.move === 2 && reading.station === "A" && "valuesMm" in reading
      ? { ...reading, valuesMm: reading.valuesMm.map((value) => value + 25) }
      : reading,
  );
  const misread = { ...record, readings: { ...record.readings, battens } };
  render(<LinePanel record={misread} so={testSoFar(misread)} />);
  expect(screen.getByText("Likely: misread batten")).toBeDefined();
  expect(screen.getByText(/repeat move 2/)).toBeDefined();
});
