import type { Metadata } from "next";
import { requireRole } from "@/app/access";
import { PlanPage } from "@/components/plan/plan-page";
import { PageTitle } from "@/components/ui/page-title";
import { database } from "@/db/server/connection";
import { planRecord } from "@/db/server/test-plan";

export const metadata: Metadata = { title: "Plan" };

export default async function Page({ params }: { params: Promise<{ id: string }> }) {
  const { id } = await params;
  const { test, roles } = await requireRole(id, ["lead", "engineer"], `/tests/${id}/plan`);
  return (
    <>
      <PageTitle title="Plan" over={`${test.vesselCopy.vessel.name} · ${test.title}`} />
      <PlanPage record={planRecord(database(), id)} mayState={roles.includes("engineer")} />
    </>
  );
}
