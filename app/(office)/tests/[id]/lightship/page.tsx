import type { Metadata } from "next";
import { requireRole } from "@/app/access";
import { LightshipPage } from "@/components/lightship/lightship-page";
import { RecordFile } from "@/components/lightship/record-file";
import { PageTitle } from "@/components/ui/page-title";
import { database } from "@/db/server/connection";
import { recordOf } from "@/db/server/record-as-it-stands";

export const metadata: Metadata = { title: "Lightship" };

export default async function Page({ params }: { params: Promise<{ id: string }> }) {
  const { id } = await params;
  const { test, roles } = await requireRole(id, ["engineer", "lead", "witness"], `/tests/${id}/lightship`);
  return (
    <>
      <PageTitle title="Lightship" over={`${test.vesselCopy.vessel.name} · ${test.title}`} />
      <LightshipPage record={recordOf(database(), id)} mayState={roles.includes("engineer")} />
      <RecordFile test={id} />
    </>
  );
}
