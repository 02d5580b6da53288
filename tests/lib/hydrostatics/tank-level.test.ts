import { describe, expect, it } from "vitest";
import { type LevelRow, levelRow } from "@/lib/hydrostatics/tank-level";

const row = (level: number, volume: number, inertia: number): LevelRow => ({ level, volume, lcg: 20, tcg: 1, vcg: level / 2, inertia });
const rows = [row(0, 0, 0), row(1, 10, 8), row(2, 22, 12), row(3, 34, 0)];

describe("row of a tank's table", () => {
  it("is the table's own at its levels", () => {
    expect(rows.map(({ level }) => levelRow(rows, level))).toEqual(rows);
  });

  it("is linear between slack rows", () => {
    expect(levelRow(rows, 1.5)).toEqual({ level: 1.5, volume: 16, lcg: 20, tcg: 1, vcg: 0.75, inertia: 10 });
  });

  it("keeps the last slack free surface up to full, and the first down to empty", () => {
    expect(levelRow(rows, 2.99)?.inertia).toBe(12);
    expect(levelRow(rows, 0.01)?.inertia).toBe(8);
  });

  it("has no free surface exactly empty or exactly full", () => {
    expect([levelRow(rows, 0)?.inertia, levelRow(rows, 3)?.inertia]).toEqual([0, 0]);
  });

  it("carries the longitudinal second moment only where every row has it", () => {
    const full = rows.map((each) => ({ ...each, inertiaLongitudinal: 2 * each.inertia }));
    expect(levelRow(full, 1.5)?.inertiaLongitudinal).toBe(20);
    expect(levelRow([...full.slice(0, 3), rows[3] as LevelRow], 1.5)).not.toHaveProperty("inertiaLongitudinal");
  });

  it("is null outside the table", () => {
    expect([levelRow(rows, -0.01), levelRow(rows, 3.01)]).toEqual([null, null]);
  });
});
