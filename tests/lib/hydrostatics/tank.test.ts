import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { type Tank, type TankRow, tankContents } from "@/lib/hydrostatics/tank";
import { promised } from "@/lib/result";

const upright = { trim: 0, tanHeel: 0, lbp: 60 };

/** A box tank 6 m long, 4 m broad, 3 m deep, its centre at x = 23, y = 2, bottom at z = 0.5. */
const boxRow = (level: number): TankRow => ({
  level,
  volume: 24 * level,
  lcg: 23,
  tcg: 2,
  vcg: 0.5 + level / 2,
  inertia: level === 0 || level === 3 ? 0 : 32,
  inertiaLongitudinal: level === 0 || level === 3 ? 0 : 72,
});
const box: Tank = { id: "FW", density: 1.5, measure: "sounding", table: [0, 0.5, 1.5, 2.5, 3].map(boxRow) };

describe("tank contents", () => {
  it("are those of the box at any level", () => {
    fc.assert(
      fc.property(fc.double({ min: 0.001, max: 2.999, noNaN: true }), (level) => {
        const found = promised(tankContents(box, level, upright));
        expect(found.volume).toBeCloseTo(24 * level, 12);
        expect(found.mass).toBeCloseTo(36 * level, 12);
        expect(found.vcg).toBeCloseTo(0.5 + level / 2, 13);
        expect(found).toMatchObject({ lcg: 23, tcg: 2, freeSurfaceInertia: 32, inertiaLongitudinal: 72 });
      }),
    );
  });

  it("have no free surface exactly empty or exactly full", () => {
    expect(promised(tankContents(box, 0, upright))).toMatchObject({ mass: 0, freeSurfaceInertia: 0 });
    expect(promised(tankContents(box, 3, upright))).toMatchObject({ mass: 108, freeSurfaceInertia: 0 });
  });

  it("take the level of an ullage as read, empty at its largest", () => {
    const ullage: Tank = { ...box, measure: "ullage", table: box.table.map((row) => ({ ...row, level: 3.2 - row.level })) };
    const found = promised(tankContents(ullage, 2, upright));
    expect(found.volume).toBeCloseTo(24 * 1.2, 12);
    expect(found.freeSurfaceInertia).toBe(32);
    expect(promised(tankContents(ullage, 3.2, upright)).volume).toBe(0);
  });

  it("carry the sounding from the pipe to the centre along the tilted surface", () => {
    // pipe 3 m abaft and 1.5 m inboard of the centre; 0.6 m by the stern over 60 m, 2 % to starboard
    const piped: Tank = { ...box, pipe: [20, 0.5] };
    const found = promised(tankContents(piped, 1, { trim: 0.6, tanHeel: 0.02, lbp: 60 }));
    expect(found.level).toBeCloseTo(1 - 0.03 + 0.03, 13);
    const listed = promised(tankContents(piped, 1, { trim: 0, tanHeel: 0.02, lbp: 60 }));
    expect(listed.volume).toBeCloseTo(24 * 1.03, 12);
  });

  it("carry an ullage the other way", () => {
    const ullage: Tank = {
      ...box,
      measure: "ullage",
      pipe: [20, 0.5],
      table: box.table.map((row) => ({ ...row, level: 3.2 - row.level })),
    };
    const found = promised(tankContents(ullage, 2.2, { trim: 0, tanHeel: 0.02, lbp: 60 }));
    expect(found.volume).toBeCloseTo(24 * 1.03, 12);
  });

  it("leave a full or empty tank uncorrected: it has no surface to tilt", () => {
    const piped: Tank = { ...box, pipe: [20, 0.5] };
    const tilted = { trim: 0.6, tanHeel: 0.05, lbp: 60 };
    expect(promised(tankContents(piped, 3, tilted)).level).toBe(3);
    expect(promised(tankContents(piped, 0, tilted)).volume).toBe(0);
  });

  it("are linear in trim where the table has trims, and then know no pipe", () => {
    const trims: Tank = {
      ...box,
      pipe: [20, 0.5],
      table: [0, 1].flatMap((trim) => box.table.map((row) => ({ ...row, trim, volume: row.volume + trim, lcg: 23 - trim }))),
    };
    const found = promised(tankContents(trims, 1, { trim: 0.25, tanHeel: 0.02, lbp: 60 }));
    expect(found).toMatchObject({ volume: expect.closeTo(24.25, 12), lcg: 22.75, level: 1, freeSurfaceInertia: 32 });
  });

  it("refuse a level outside the table, as read or after the correction", () => {
    const refusal = { type: "OutsideTankTable", tank: "FW", quantity: "level", lowest: 0, highest: 3 };
    expect(tankContents(box, 3.1, upright)).toEqual({ ok: false, refusal: { ...refusal, value: 3.1, asRead: 3.1 } });
    const piped: Tank = { ...box, pipe: [20, 0.5] };
    expect(tankContents(piped, 2.98, { trim: 0, tanHeel: 0.02, lbp: 60 })).toEqual({
      ok: false,
      refusal: { ...refusal, value: expect.closeTo(3.01, 12), asRead: 2.98 },
    });
  });

  it("refuse a trim outside the table's trims", () => {
    const trims: Tank = { ...box, table: [0, 1].flatMap((trim) => box.table.map((row) => ({ ...row, trim }))) };
    const refusal = { type: "OutsideTankTable", tank: "FW", quantity: "trim", lowest: 0, highest: 1 };
    for (const trim of [-0.1, 1.1]) {
      expect(tankContents(trims, 1, { ...upright, trim })).toEqual({ ok: false, refusal: { ...refusal, value: trim, asRead: trim } });
    }
  });

  it("refuse a slack tank of which only empty and full are known", () => {
    const ends: Tank = { ...box, table: [0, 3].map(boxRow) };
    expect(tankContents(ends, 1, upright)).toEqual({ ok: false, refusal: { type: "FreeSurfaceUnknown", tank: "FW", level: 1 } });
    expect(promised(tankContents(ends, 3, upright)).mass).toBe(108);
  });

  it("refuse a table with two rows at one level, and an empty one", () => {
    const twice: Tank = { ...box, table: [0, 1, 1, 3].map(boxRow) };
    expect(tankContents(twice, 2, upright)).toEqual({ ok: false, refusal: { type: "RepeatedTankLevel", tank: "FW", level: 1, trim: 0 } });
    expect(tankContents({ ...box, table: [] }, 1, upright)).toEqual({ ok: false, refusal: { type: "EmptyTankTable", tank: "FW" } });
  });
});
