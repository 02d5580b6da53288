import { describe, expect, test } from "vitest";
import { skerryTern } from "@/db/seed/skerry-tern";
import { hullFromOffsets } from "@/lib/hydrostatics/hull";
import { hydrostaticsAt } from "@/lib/hydrostatics/hydrostatics-at";
import { expectedMoves } from "@/lib/inclining/expected-moves";
import type { TestRecord } from "@/lib/record/test-record";
import { promised } from "@/lib/result";

const { record } = skerryTern();
const ship = { displacement: 1480, lcg: 24.2, tcg: 0, vcg: 5.4, density: 1.02 };

describe("by offsets", () => {
  const found = promised(expectedMoves(record, ship));

  test("the ship heels to starboard under a moment to starboard, by M/(Δ·GM) to a hundredth, and the deck edge sinks with it", () => {
    expect(found.by).toBe("offsets");
    for (const { moment, tanHeel } of found.moves.filter(({ moment }) => moment !== 0)) {
      expect(tanHeel / (moment / (ship.displacement * found.gmFluid))).toBeCloseTo(1, 1.5);
    }
    const [zero, first] = found.moves;
    const lost = (zero?.leastFreeboard ?? 0) - (first?.leastFreeboard ?? 0);
    // half the breadth of the deck where it is lowest, times the change of heel
    expect(lost / Math.abs(first?.tanHeel ?? 1)).toBeGreaterThan(4.5);
    expect(lost / Math.abs(first?.tanHeel ?? 1)).toBeLessThan(record.vessel.breadth / 2 + 0.01);
  });

  test("a ship heavier than the hull carries is refused", () => {
    expect(expectedMoves(record, { ...ship, displacement: 20_000 })).toMatchObject({ ok: false, refusal: { type: "VolumeOutOfReach" } });
  });
});

describe("by a table", () => {
  // worked out from the same hull on even keel, every 5 cm
  const hydrostatics = evenKeelTable();
  const byTable = promised(expectedMoves({ ...record, hydrostatics }, ship));

  test("the metacentre on even keel gives the moves that the hull on even keel gives", () => {
    const level = promised(expectedMoves(record, { ...ship, lcg: lcbAt(byTable.plane.draftAtAp) }));
    expect(byTable.by).toBe("table");
    expect(Math.abs(byTable.gmFluid - level.gmFluid)).toBeLessThan(0.002);
    byTable.moves.forEach(({ tanHeel }, i) => {
      expect(Math.abs(tanHeel - (level.moves[i]?.tanHeel ?? 1))).toBeLessThan(2e-4);
    });
    expect(byTable.moves.every(({ leastFreeboard }) => leastFreeboard === null)).toBe(true);
  });

  test("a volume outside the table is refused with its limits", () => {
    const refused = expectedMoves({ ...record, hydrostatics }, { ...ship, displacement: 100 });
    expect(refused).toMatchObject({ ok: false, refusal: { type: "VolumeOutOfReach", volume: 100 / 1.02 } });
  });
});

function levelAt(draftAtAp: number) {
  if (record.hydrostatics.kind !== "offsets") throw new Error("the demo's ship has offsets");
  const hull = promised(hullFromOffsets(record.hydrostatics));
  return promised(hydrostaticsAt(hull, { draftAtAp, slopeAlong: 0, tanHeel: 0, sag: 0, lbp: record.vessel.lbp }));
}

function lcbAt(draft: number): number {
  return levelAt(draft).lcb;
}

function evenKeelTable(): Extract<TestRecord["hydrostatics"], { kind: "table" }> {
  const drafts = Array.from({ length: 51 }, (_, i) => 2 + 0.05 * i);
  const rows = drafts.map((draft) => {
    const { volume, lcb, vcb, lcf, kmt, kml, waterplaneArea } = levelAt(draft);
    return { draft, trim: 0, volume, lcb, vcb, lcf, kmt, kml, waterplaneArea };
  });
  return { kind: "table", rows };
}
