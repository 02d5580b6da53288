import type { Metadata } from "next";
import { notFound } from "next/navigation";
import { requireRole } from "@/app/access";
import { Reconcile } from "@/components/reconcile/reconcile";
import { PageTitle } from "@/components/ui/page-title";
import { database } from "@/db/server/connection";
import { liveSnapshot } from "@/db/server/live-snapshot";

export const metadata: Metadata = { title: "Reconcile" };

export default async function Page({ params }: { params: Promise<{ id: string }> }) {
  const { id } = await params;
  const { test, person } = await requireRole(id, ["lead", "engineer"], `/tests/${id}/reconcile`);
  const first = liveSnapshot(database(), id, new Date().toISOString()) ?? notFound();
  return (
    <>
      <PageTitle title="Reconcile" over={`${test.vesselCopy.vessel.name} · ${test.title}`} />
      <Reconcile test={id} person={{ id: person.id, name: person.name }} first={first} />
    </>
  );
}
