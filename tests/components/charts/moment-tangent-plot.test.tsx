import { cleanup, fireEvent, render, screen, within } from "@testing-library/react";
import { afterEach, describe, expect, test } from "vitest";
import { MomentTangentPlot } from "@/components/charts/moment-tangent-plot";
import { PlotTable } from "@/components/charts/plot-table";
import { type LineSoFar, lineSoFar } from "@/components/control/line-so-far";
import type { TestRecord } from "@/lib/record/test-record";
import { bargeRecord, displacement, gm, momentAt } from "../control/barge";
import { bargeSnapshot, battenSlot } from "../control/barge-snapshot";

afterEach(cleanup);

function drawn(so: LineSoFar) {
  const { container } = render(<MomentTangentPlot points={so.points} line={{ slope: so.line.slope * 1000 }} stations={so.stations} />);
  return container;
}

function drawable(record: TestRecord): LineSoFar {
  const so = lineSoFar(record);
  if (!so) throw new Error("the barge gives no line");
  return so;
}

function placeOf(container: HTMLElement, point: string): [number, number] {
  const transform = container.querySelector(`[data-point="${point}"]`)?.getAttribute("transform") ?? "";
  const [x = Number.NaN, y = Number.NaN] = [...transform.matchAll(/-?[\d.]+/g)].map(([figure]) => Number(figure));
  return [x, y];
}

describe("the moment–tangent plot", () => {
  const so = drawable(bargeRecord(4));

  test("draws one marker for each point of its table, in the plot and in the residuals", () => {
    const container = drawn(so);
    render(<PlotTable points={so.points} />);
    const rows = within(screen.getByRole("table")).getAllByRole("row").length - 1;
    expect(rows).toBe(5 * 3);
    expect(container.querySelectorAll("[data-point$=tangent]")).toHaveLength(rows);
    expect(container.querySelectorAll("[data-point$=residual]")).toHaveLength(rows);
  });

  test("puts equal moments to either side at equal distances from zero", () => {
    const container = drawn(so);
    expect(momentAt(1)).toBe(-momentAt(4));
    const [zero] = placeOf(container, "A 0 tangent");
    const [starboard] = placeOf(container, "A 1 tangent");
    const [port] = placeOf(container, "A 4 tangent");
    expect(starboard).toBeGreaterThan(zero);
    // screen pixels, from one linear scale
    expect(starboard - zero).toBeCloseTo(zero - port, 9);
  });

  test("draws the points of an exact line on it", () => {
    const container = drawn(so);
    const line = container.querySelector("[data-testid=common-line]");
    const [x1, y1, x2, y2] = ["x1", "y1", "x2", "y2"].map((name) => Number(line?.getAttribute(name))) as [number, number, number, number];
    for (const no of [0, 1, 2, 3, 4]) {
      const [x, y] = placeOf(container, `B ${no} tangent`);
      expect(y).toBeCloseTo(y1 + ((y2 - y1) * (x - x1)) / (x2 - x1), 6);
    }
  });

  test("lists the tangent that the ship's own figures give", () => {
    render(<PlotTable points={so.points} />);
    const row = screen.getAllByRole("row").find((each) => each.textContent?.startsWith("4A"));
    // −40 t·m over 1476 t and 2.2 m: 12.318 mm to port in a metre
    expect((momentAt(4) / (displacement * gm)) * 1000).toBeCloseTo(-12.318, 3);
    expect(row?.textContent).toContain("−40.00 t·m");
    expect(row?.textContent).toContain("−12.32 mm per m");
  });

  test("walks along the line with the arrow keys and says the values", () => {
    const container = drawn(so);
    const [first, second] = screen.getAllByRole("graphics-symbol");
    if (!first || !second) throw new Error("no markers to walk along");
    fireEvent.focus(first);
    expect(container.textContent).toContain("station A, move 4");
    fireEvent.keyDown(first, { key: "ArrowRight" });
    expect(container.textContent).toContain("station B, move 4");
    expect(document.activeElement).toBe(second);
  });

  test("draws a disagreeing reading hollow and leaves it out of the line", () => {
    const value = { mode: "settled" as const, valuesMm: [80] };
    const other = { slot: battenSlot(1, "A"), value, from: "0190a5d1-5d00-4000-8000-0000000000a2" };
    const disputed = drawable(bargeSnapshot({ read: 4, open: null, called: [other] }).record);
    const out = disputed.points.filter((point) => point.leftOut !== null);
    expect(out.map((point) => point.station)).toEqual(["A", "A"]);
    expect(disputed.line.slope).toBeCloseTo(so.line.slope, 12);
    const container = drawn(disputed);
    expect(container.querySelectorAll('[data-point="A 1 tangent"] path.fill-sailcloth-raised')).toHaveLength(2);
    expect(screen.getByText(/takes no part in the line/)).toBeDefined();
  });
});
