import { cleanup, render, screen, within } from "@testing-library/react";
import { afterEach, expect, test } from "vitest";
import { MovesTable } from "@/components/lightship/moves-table";
import { incliningTest } from "@/lib/inclining/inclining-test";
import type { TestRecord } from "@/lib/record/test-record";
import { promised } from "@/lib/result";
import { bargeRecord } from "../control/barge";

afterEach(cleanup);

function rows(record: TestRecord): string[][] {
  render(<MovesTable test={record} ship={promised(incliningTest(record))} gmDecimals={3} />);
  const table = screen.getByRole("table", { name: "Each move against the others" });
  return within(table)
    .getAllByRole("row")
    .slice(1)
    .map((row) => [...within(row).getAllByRole("rowheader"), ...within(row).getAllByRole("cell")].map((cell) => cell.textContent ?? ""));
}

test("a barge that heels by the moment alone has GM 2.2 m without any of its moves", () => {
  const shown = rows(bargeRecord(4));
  expect(shown.map(([move, moment]) => [move, moment])).toEqual([
    ["0", "0.0 t·m"],
    ["1", "+40.0 t·m"],
    ["2", "+42.5 t·m"],
    ["3", "0.0 t·m"],
    ["4", "−40.0 t·m"],
  ]);
  expect(new Set(shown.map((cells) => cells[4]))).toEqual(new Set(["2.200 m"]));
  expect(new Set(shown.map((cells) => cells[3]))).toEqual(new Set(["0.0"]));
});

test("the move that all stations read wrongly stands off most, and without it GM is right", () => {
  const record = bargeRecord(4);
  const battens = record.readings.battens.map((reading) => {
    if (reading.move !== 1) return reading;
    // 5 mm per m at each station
    if ("valuesMm" in reading)
      return { ...reading, valuesMm: reading.valuesMm.map((value) => value + (reading.station === "A" ? 20 : 18)) };
    return "starboardMm" in reading ? { ...reading, starboardMm: reading.starboardMm.map((value) => value + 45) } : reading;
  });
  const shown = rows({ ...record, readings: { ...record.readings, battens } });
  expect(shown[1]?.[4]).toBe("2.200 m");
  const off = shown.map((cells) => Math.abs(Number((cells[3] ?? "").replace("−", "-"))));
  expect(off.indexOf(Math.max(...off))).toBe(1);
});
