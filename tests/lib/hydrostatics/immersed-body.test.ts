import { describe, expect, it } from "vitest";
import { immersedBody } from "@/lib/hydrostatics/immersed-body";
import { boxOffsets, hullOf } from "./sample-hulls";
import { planeAt } from "./sample-planes";

const box = boxOffsets(60, 12, 5);

describe("immersed body", () => {
  it("lets the shell widen the body and its waterplane alike", () => {
    const bare = immersedBody(hullOf(box), planeAt(2, 60));
    const plated = immersedBody(hullOf({ ...box, shellFactor: 1.25 }), planeAt(2, 60));
    expect(plated.volume).toBeCloseTo(1.25 * bare.volume, 11);
    expect(plated.momentZ).toBeCloseTo(1.25 * bare.momentZ, 11);
    expect(plated.areaYY).toBeCloseTo(1.25 * bare.areaYY, 10);
  });

  it("adds appendages with their moments, and takes off what holds water", () => {
    const appendages = [
      { label: "rudder", volume: 3, x: -0.5, y: 0, z: 1 },
      { label: "sea chest", volume: -1, x: 20, y: 4, z: 0.2 },
    ];
    const body = immersedBody(hullOf({ ...box, appendages }), planeAt(2, 60));
    expect(body.volume).toBeCloseTo(1442, 11);
    expect(body.momentX).toBeCloseTo(1440 * 30 - 1.5 - 20, 9);
    expect(body.momentY).toBeCloseTo(-4, 11);
    expect(body.momentZ).toBeCloseTo(1440 + 3 - 0.2, 10);
    expect(body.area).toBeCloseTo(720, 11);
  });

  it("is nothing in a dry hull, and has no waterplane in a sunken one", () => {
    expect(immersedBody(hullOf(box), planeAt(-0.1, 60))).toMatchObject({ volume: 0, area: 0 });
    const sunken = immersedBody(hullOf(box), planeAt(5.1, 60));
    expect(sunken.volume).toBeCloseTo(3600, 10);
    expect(sunken.area).toBe(0);
  });
});
