import { describe, expect, it } from "vitest";
import { restAt, type SimulatedTruth, simulatedShip } from "@/db/seed/simulated-ship";
import { recordFrom } from "@/lib/record/parse-record";
import type { TestRecord } from "@/lib/record/test-record";
import { promised } from "@/lib/result";
import full from "../../published/records/box-full.json";
import fullTruth from "../../published/records/box-full.truth.json";
import plain from "../../published/records/box-plain.json";
import plainTruth from "../../published/records/box-plain.truth.json";

const levels = (soundings: readonly { tank: string; value: number }[]) =>
  Object.fromEntries(soundings.map(({ tank, value }) => [tank, value]));

/** The two barges were simulated by strip integration: another method and other code. */
describe.each([
  { name: "plain", document: plain, truth: plainTruth, density: 1.025, within: 1e-9 },
  // there the liquid's surface is clipped by the tank's walls; here it moves by its second moment: the same to rounding
  { name: "with liquids", document: full, truth: fullTruth, density: 1.018, within: 1e-8 },
])("a simulated barge, $name", ({ document, truth, density, within }) => {
  const plan = withSquareSurfaces(promised(recordFrom(document)));
  const given: SimulatedTruth = { lightship: truth.lightship, waterDensity: density, levels: levels(plan.readings.soundings) };
  const ship = promised(simulatedShip(plan, given));

  it("rests at every move at the heel that another simulation found", () => {
    for (const { no } of plan.moves) {
      expect(Math.abs(promised(restAt(ship, no, "moves")).tanHeel - (truth.tanHeel[no] ?? 0))).toBeLessThan(within);
    }
  });

  it("floats at the same drafts", () => {
    const plane = promised(restAt(ship, 0, "drafts"));
    expect(Math.abs(plane.draftAtAp - truth.draftAP)).toBeLessThan(1e-6);
    expect(Math.abs(plane.draftAtAp + 60 * plane.slopeAlong - truth.draftFP)).toBeLessThan(1e-6);
  });
});

// the barge's slack tank is 6 × 6 m; its table gives the second moment about one axis only
function withSquareSurfaces(record: TestRecord): TestRecord {
  const tanks = record.tanks.map((tank) => ({ ...tank, table: tank.table.map((row) => ({ ...row, inertiaLongitudinal: row.inertia })) }));
  return { ...record, tanks };
}

describe("a ship that can't be simulated", () => {
  const plan = promised(recordFrom(plain));
  const truth: SimulatedTruth = { lightship: plainTruth.lightship, waterDensity: 1.025, levels: {} };

  it("is refused where only a table is known", () => {
    const row = { trim: 0, draft: 2, volume: 1440, lcb: 30, vcb: 1, lcf: 30, waterplaneArea: 720, kmt: 7, kml: 151 };
    const hydrostatics = { kind: "table" as const, rows: [row, { ...row, draft: 3 }] };
    expect(simulatedShip({ ...plan, hydrostatics }, truth)).toMatchObject({ ok: false, refusal: { faults: [{ type: "NoOffsets" }] } });
  });

  it("is refused at a move that the plan does not have, and where she would sink", () => {
    const ship = promised(simulatedShip(plan, truth));
    expect(restAt(ship, 99, "moves")).toMatchObject({ ok: false, refusal: { type: "UnknownMove", move: 99 } });
    const heavy = promised(simulatedShip(plan, { ...truth, lightship: { ...truth.lightship, displacement: 9000 } }));
    expect(restAt(heavy, 0, "moves")).toMatchObject({ ok: false, refusal: { type: "VolumeOutOfReach" } });
  });
});
