import { cleanup, render, screen } from "@testing-library/react";
import { afterEach, describe, expect, test } from "vitest";
import { heeledTooFar } from "@/components/control/heel-stop";
import { movesNotMeasured } from "@/components/control/moves-not-measured";
import { StandingResult } from "@/components/control/standing-result";
import { StopSign } from "@/components/control/stop-sign";
import { testSoFar } from "@/lib/inclining/test-so-far";
import type { TestRecord } from "@/lib/record/test-record";
import { bargeRecord, gm } from "./barge";
import { bargeSnapshot } from "./barge-snapshot";

afterEach(cleanup);

const { moves, due } = bargeSnapshot({ read: 4, open: null });

function shown(record: TestRecord, unmeasured: readonly number[] = []) {
  return (
    render(<StandingResult record={record} so={testSoFar(record)} moves={moves} unmeasured={unmeasured} />).container.textContent ?? ""
  );
}

describe("the result as it stands", () => {
  test("gives GM and KG of the barge, to no more than a millimetre, and marks them preliminary", () => {
    const text = shown(bargeRecord(4));
    expect(text).toContain(`${gm}00 m`);
    expect(text).toContain("4.800 m");
    expect(text).toContain("Preliminary, not for loading or sailing");
    expect(text).toContain("5 of 5 moves in the line");
  });

  test("gives no interval before three moves, and says so", () => {
    const text = shown(bargeRecord(1));
    expect(text).toContain("2.20 m");
    expect(text).not.toContain("±");
    expect(text).toContain("three are needed for an interval");
  });

  test("shows no figure while drafts are missing, but the sentence that says it", () => {
    const record = bargeRecord(4);
    const text = shown({ ...record, readings: { ...record.readings, drafts: [] } });
    expect(text).toContain("Still missing");
    expect(text).not.toContain("4.800");
    expect(screen.getAllByRole("listitem").length).toBeGreaterThan(0);
  });

  test("names the moves at which the plan's places stand for measured ones", () => {
    expect(movesNotMeasured(due, testSoFar(bargeRecord(2)))).toEqual([0, 1, 2]);
    expect(shown(bargeRecord(2), [0, 1, 2])).toContain("not measured at moves 0–2: the plan’s places are used");
  });
});

describe("the stop", () => {
  const tripped = (degrees: number) => [
    { no: 2, session: 1, moment: 40, along: 0, tanHeel: Math.tan((degrees * Math.PI) / 180), residual: 0, stations: 3 },
  ];

  test("is called beyond 4° to either side and not before", () => {
    expect(heeledTooFar(tripped(3.99))).toEqual([]);
    expect(heeledTooFar(tripped(4.01))).toHaveLength(1);
    expect(heeledTooFar(tripped(-4.01))).toHaveLength(1);
  });

  test("stays away on the barge, which heels less than a degree", () => {
    render(<StopSign so={testSoFar(bargeRecord(4))} />);
    expect(screen.queryByRole("alert")).toBeNull();
  });

  test("fills the page in large type when a heavier weight heels her too far", () => {
    const record = bargeRecord(4);
    const battens = record.readings.battens.map((each) =>
      "valuesMm" in each ? { ...each, valuesMm: each.valuesMm.map((mm) => 7 * mm) } : each,
    );
    const pendulums = battens.filter(({ station }) => station !== "U");
    render(<StopSign so={testSoFar({ ...record, readings: { ...record.readings, battens: pendulums } })} />);
    expect(screen.getByRole("alert").textContent).toContain("more than 4°");
  });
});
