import { expect, test } from "vitest";
import type { Waterplane } from "@/lib/frame";
import { edgesInTheWater } from "@/lib/hydrostatics/edges-in-the-water";

const plane: Waterplane = { draftAtAp: 2, slopeAlong: 0, tanHeel: 0, sag: 0, lbp: 60 };
const section = (points: readonly (readonly [number, number])[]) => ({ sections: [{ x: 30, points }] });

test("finds a chine just above the water on the side that heels down", () => {
  const chine = section([
    [3, 0],
    [5, 2.1],
    [5.1, 5],
  ]);
  expect(edgesInTheWater(chine, plane, [-0.05, 0.05])).toEqual([
    { kind: "knuckle", x: 30, side: "starboard", tanHeel: (2.1 - 2) / 5 },
    { kind: "knuckle", x: 30, side: "port", tanHeel: -(2.1 - 2) / 5 },
  ]);
  expect(edgesInTheWater(chine, plane, [-0.05, 0.01])).toHaveLength(1);
  expect(edgesInTheWater(chine, plane, [-0.01, 0.01])).toEqual([]);
});

test("finds the deck edge of a low ship, and none on a bilge drawn with small bends", () => {
  const low = section([
    [6, 0],
    [6, 2.2],
  ]);
  expect(edgesInTheWater(low, plane, [0, 0.05]).map(({ kind, side }) => [kind, side])).toEqual([["deck-edge", "starboard"]]);
  const round = section(
    Array.from({ length: 20 }, (_, i) => [6 * Math.sin((i * Math.PI) / 38), 4 - 4 * Math.cos((i * Math.PI) / 38)] as const),
  );
  expect(edgesInTheWater(round, plane, [-0.1, 0.1]).filter(({ kind }) => kind === "knuckle")).toEqual([]);
});
