import { randomUUID } from "node:crypto";
import { eq } from "drizzle-orm";
import { z } from "zod";
import { canonicalJson } from "@/lib/ledger/canonical-json";
import { testRecordSchema } from "@/lib/record/test-record";
import { answer, type Result, refuse } from "@/lib/result";
import type { VesselCopy } from "../schema/tests";
import { vessels } from "../schema/vessels";
import type { Act } from "./act";
import { type Database, inTransaction } from "./connection";
import { writeEntry } from "./ledger-entries";

const { vessel, hydrostatics, draftMarks, freeboardMarks, tanks, previous } = testRecordSchema.shape;

/** A vessel as it is written down: the parts of a test record that belong to her and not to the test. */
export const vesselSchema = z.strictObject({ vessel, hydrostatics, draftMarks, freeboardMarks, tanks, previous });

export type Vessel = VesselCopy & { readonly id: string; readonly changedAt: string };

export function vesselById(db: Database, id: string): Vessel | undefined {
  const row = db.select().from(vessels).where(eq(vessels.id, id)).get();
  return row && { id: row.id, changedAt: row.changedAt, ...copyOf(row) };
}

export function vesselsByName(db: Database): { id: string; name: string; hullNumber: string | null; changedAt: string }[] {
  const { id, name, hullNumber, changedAt } = vessels;
  return db.select({ id, name, hullNumber, changedAt }).from(vessels).orderBy(name, id).all();
}

/** A vessel known already that is written down in exactly this way. */
export function sameVessel(db: Database, given: VesselCopy): string | undefined {
  const wanted = canonicalJson(copyOf({ ...rowOf(given), id: "", createdAt: "", changedAt: "" }));
  const namesakes = db.select().from(vessels).where(eq(vessels.name, given.vessel.name)).all();
  return namesakes.find((row) => canonicalJson(copyOf(row)) === wanted)?.id;
}

export function createVessel(db: Database, given: VesselCopy, act: Act, id: string = randomUUID()): string {
  inTransaction(db, () => {
    db.insert(vessels)
      .values({ id, ...rowOf(given), createdAt: act.at, changedAt: act.at })
      .run();
    writeEntry(db, null, { ...act, what: "vessel.create", after: { vessel: id, name: given.vessel.name } });
  });
  return id;
}

/** Changes the office's vessel; tests made from her before keep the copy they took. */
export function changeVessel(
  db: Database,
  id: string,
  given: VesselCopy,
  act: Act,
): Result<string, { type: "VesselUnknown"; vessel: string }> {
  return inTransaction(db, () => {
    const before = vesselById(db, id);
    if (!before) return refuse({ type: "VesselUnknown", vessel: id });
    db.update(vessels)
      .set({ ...rowOf(given), changedAt: act.at })
      .where(eq(vessels.id, id))
      .run();
    writeEntry(db, null, { ...act, what: "vessel.change", before, after: { id, ...given } });
    return answer(id);
  });
}

function rowOf({ vessel, hydrostatics, draftMarks, freeboardMarks = [], tanks, previous }: VesselCopy) {
  const { name, hullNumber = null, lbp, breadth, depth } = vessel;
  return { name, hullNumber, lbp, breadth, depth, hydrostatics, draftMarks, freeboardMarks, tanks, previous: previous ?? null };
}

function copyOf(row: typeof vessels.$inferSelect): VesselCopy {
  const { name, hullNumber, lbp, breadth, depth, hydrostatics, draftMarks, freeboardMarks, tanks, previous } = row;
  const vessel = { name, ...(hullNumber === null ? {} : { hullNumber }), lbp, breadth, depth };
  const optional = { ...(freeboardMarks.length > 0 ? { freeboardMarks } : {}), ...(previous ? { previous } : {}) };
  return { vessel, hydrostatics, draftMarks, tanks, ...optional };
}
