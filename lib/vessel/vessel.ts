import { z } from "zod";
import { slopeAlongFromTrim } from "@/lib/frame";
import { hullFromOffsets } from "@/lib/hydrostatics/hull";
import { tableHydrostatics } from "@/lib/hydrostatics/hydrostatic-table";
import { tankContents } from "@/lib/hydrostatics/tank";
import { type Faults, faultsOf, inside, refuseFaults } from "@/lib/inclining/faults";
import { repeated } from "@/lib/record/plan-faults";
import { previousSchema } from "@/lib/record/plan-schema";
import { text } from "@/lib/record/quantities";
import { schemaFaults } from "@/lib/record/schema-faults";
import { testRecordSchema } from "@/lib/record/test-record";
import { answer, type Refusal, type Result } from "@/lib/result";

const { vessel, hydrostatics, draftMarks, freeboardMarks, tanks, previous } = testRecordSchema.shape;

/** A lightship found before: by an earlier test of hers, or by one of a sister. */
export const lightshipSchema = z.strictObject({ label: text, date: z.iso.date().optional(), ...previousSchema.shape });

/** A vessel as the office writes her down; hydrostatics may still be missing. `previous` is the lightship that tests are compared with. */
export const vesselSchema = z.strictObject({
  vessel,
  hydrostatics: hydrostatics.nullable(),
  draftMarks,
  freeboardMarks,
  tanks,
  previous,
  lightships: z.array(lightshipSchema).optional(),
});

export type Vessel = z.infer<typeof vesselSchema>;
export type Particulars = Vessel["vessel"];
export type Lightship = z.infer<typeof lightshipSchema>;
export type VesselPart = keyof Vessel;

/**
 * The vessel in a document, or every fault of it with its place: shapes first, then names given twice, and what hull, table
 * and tanks refuse of themselves.
 */
export function vesselFrom(document: unknown): Result<Vessel, Faults> {
  const shaped = vesselSchema.safeParse(document);
  if (!shaped.success) return refuseFaults(schemaFaults(document, shaped.error.issues));
  const faults = faultsOfVessel(shaped.data);
  return faults.length > 0 ? refuseFaults(faults) : answer(shaped.data);
}

function faultsOfVessel(given: Vessel): readonly Refusal[] {
  const marks = [...named("draftMarks", given.draftMarks), ...named("freeboardMarks", given.freeboardMarks ?? [])];
  return [
    ...repeated(marks),
    ...repeated(named("tanks", given.tanks)),
    ...faultsOf(inside("hydrostatics", hydrostaticsSound(given))),
    ...given.tanks.flatMap((tank, i) => faultsOf(inside(`tanks[${i}]`, tankSound(tank)))),
  ];
}

function named(list: string, entries: readonly { readonly id: string }[]) {
  return entries.map(({ id }, i) => ({ name: id, path: `${list}[${i}].id` }));
}

// asked at one of its own rows, where nothing but the table itself can be refused
function hydrostaticsSound({ hydrostatics: given, vessel: { lbp } }: Vessel): Result<unknown> {
  if (given === null) return answer(null);
  if (given.kind === "offsets") return hullFromOffsets(given);
  const { draft = 0, trim = 0 } = given.rows[0] ?? {};
  const plane = { draftAtAp: draft + trim / 2, slopeAlong: slopeAlongFromTrim(trim, lbp), tanHeel: 0, sag: 0, lbp };
  const found = tableHydrostatics(given, { plane });
  return found.ok || found.refusal.type === "OutsideHydrostaticTable" ? answer(null) : found;
}

function tankSound(tank: Vessel["tanks"][number]): Result<unknown> {
  const { level = 0, trim = 0 } = tank.table[0] ?? {};
  const found = tankContents(tank, level, { trim, tanHeel: 0, lbp: 1 });
  return found.ok || found.refusal.type === "OutsideTankTable" ? answer(null) : found;
}
