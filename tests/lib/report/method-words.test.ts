import { expect, test } from "vitest";
import { skerryTern, skerryTernReadings } from "@/db/seed/skerry-tern";
import { incliningTest } from "@/lib/inclining/inclining-test";
import { methodDifference } from "@/lib/lightship/method-difference";
import { methodSentences } from "@/lib/report/method-words";
import { promised } from "@/lib/result";

test("says that upright sides explain the difference, where they do", () => {
  const told = methodSentences({ found: 0.00098, byWallSides: 0.00096, edges: [] });
  expect(told).toHaveLength(1);
  expect(told[0]).toMatch(/^Generalised less classical, as inclined: \+1\.0 mm\. Upright sides alone explain \+1\.0 mm/);
});

test("says that other sides explain the rest", () => {
  expect(methodSentences({ found: -0.004, byWallSides: 0.001, edges: [] })[1]).toBe(
    "The other −5.0 mm come from sides that are not upright at the waterline.",
  );
});

test("warns of a knuckle in the water", () => {
  const edges = [{ kind: "knuckle", x: 20, side: "starboard", tanHeel: 0.0349 }] as const;
  expect(methodSentences({ found: 0.02, byWallSides: 0.001, edges })[1]).toBe(
    "Within the heels of the test a knuckle met the water (from 2.0° to starboard, 20.0 m forward of AP): the classical line is not valid there; trust the generalised result.",
  );
  expect(methodSentences({ found: 0.001, byWallSides: 0.001, edges })[1]).toContain("too short a stretch of it for the line to show");
});

test("finds on the demo's ship a millimetre, of which her flare takes two from what upright sides would give", () => {
  const { record } = skerryTern();
  const tern = { ...record, readings: skerryTernReadings(7) };
  const difference = methodDifference(tern, promised(incliningTest(tern)));
  // her tuck is drawn with a bend at the aftermost section that floats
  expect(new Set(difference?.edges.map(({ x }) => x))).toEqual(new Set([2]));
  expect(difference?.found).toBeCloseTo(0.001, 3);
  expect(difference?.byWallSides).toBeCloseTo(0.003, 3);
});
