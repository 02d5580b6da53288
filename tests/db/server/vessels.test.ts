import { randomUUID } from "node:crypto";
import { expect, test } from "vitest";
import { skerryTern } from "@/db/seed/skerry-tern";
import { ledgerOf } from "@/db/server/ledger-entries";
import { changeVessel, createVessel, sameVessel, vesselById, vesselSchema, vesselsByName } from "@/db/server/vessels";
import { at, yard } from "./yard";

const { vessel, hydrostatics, draftMarks, tanks, previous } = skerryTern().record;
const ship = { vessel, hydrostatics, draftMarks, tanks, previous };

test("gives a vessel back as she was written down", () => {
  const { db } = yard();
  const id = createVessel(db, { ...ship, freeboardMarks: [{ id: "F1", x: 10, y: 6, deckEdge: 5.4 }] }, { by: null, at });
  const { id: _, changedAt, ...kept } = vesselById(db, id) ?? expect.fail("no vessel");
  expect(kept).toEqual({ ...ship, freeboardMarks: [{ id: "F1", x: 10, y: 6, deckEdge: 5.4 }] });
  expect(vesselsByName(db).map(({ name }) => name)).toEqual(["MV Skerry Tern", "MV Skerry Tern"]);
});

test("writes what a vessel was and became into the server's chain", () => {
  const { db, vessel: id, engineer } = yard();
  changeVessel(db, id, { ...ship, draftMarks: [] }, { by: engineer.id, at });
  expect(ledgerOf(db, null).at(-1)).toMatchObject({ what: "vessel.change", who: engineer.id, after: { id, draftMarks: [] } });
});

test("knows a vessel again by everything that is written of her", () => {
  const { db } = yard();
  const id = createVessel(db, ship, { by: null, at });
  expect(sameVessel(db, ship)).toBe(id);
  expect(sameVessel(db, { ...ship, vessel: { ...vessel, depth: 5.5 } })).toBeUndefined();
});

test("refuses a change of a vessel that is not here, and hydrostatics that are neither offsets nor table", () => {
  const { db } = yard();
  const nobody = randomUUID();
  expect(changeVessel(db, nobody, ship, { by: null, at })).toEqual({ ok: false, refusal: { type: "VesselUnknown", vessel: nobody } });
  expect(vesselSchema.safeParse({ ...ship, hydrostatics: { kind: "curves" } }).success).toBe(false);
  expect(vesselSchema.safeParse(ship).success).toBe(true);
});
