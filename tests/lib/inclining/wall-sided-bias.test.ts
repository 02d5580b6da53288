import { expect, test } from "vitest";
import { skerryTern, skerryTernReadings } from "@/db/seed/skerry-tern";
import type { MomentTangentLine, MoveOnLine } from "@/lib/inclining/inclined-ship";
import { incliningTest } from "@/lib/inclining/inclining-test";
import { wallSidedBias } from "@/lib/inclining/wall-sided-bias";
import { promised } from "@/lib/result";

const { record } = skerryTern();
const ship = promised(incliningTest({ ...record, readings: skerryTernReadings(7) }));

function lineWith(heels: readonly number[]): MomentTangentLine {
  const moves = heels.map((tanHeel, no): MoveOnLine => ({ no, session: 1, moment: 0, along: 0, tanHeel, residual: 0, stations: 1 }));
  return { ...ship.line, moves };
}

test("is ½·BM·0.75·tan²φ for the pattern of eight moves to φ and half of it", () => {
  const phi = 0.04;
  const { kmt, vcb } = ship.afloat.hydrostatics;
  const bm = (kmt - vcb) / (1 + ship.afloat.waterline.plane.tanHeel ** 2);
  const pattern = [0, phi / 2, phi, phi / 2, 0, -phi / 2, -phi, -phi / 2, 0];
  expect(wallSidedBias(ship.afloat, lineWith(pattern))).toBeCloseTo(0.5 * bm * 0.75 * phi ** 2, 12);
});

test("is nothing where nothing heeled", () => {
  expect(wallSidedBias(ship.afloat, lineWith([0, 0]))).toBe(0);
});
