import type { Metadata } from "next";
import { notFound } from "next/navigation";
import { allButReaders, requireRole } from "@/app/access";
import { backupNewsFor } from "@/app/backup-news";
import { BackupWarning } from "@/components/backups/backup-warning";
import { Control } from "@/components/control/control";
import { PageTitle } from "@/components/ui/page-title";
import { database } from "@/db/server/connection";
import { liveSnapshot } from "@/db/server/live-snapshot";

export const metadata: Metadata = { title: "Central control" };

export default async function Page({ params }: { params: Promise<{ id: string }> }) {
  const { id } = await params;
  const { person, test, roles } = await requireRole(id, allButReaders, `/tests/${id}/control`);
  const first = liveSnapshot(database(), id, new Date().toISOString()) ?? notFound();
  return (
    <>
      <PageTitle title="Central control" over={`${test.vesselCopy.vessel.name} · ${test.title}`} />
      <BackupWarning first={backupNewsFor(person)} />
      <Control test={id} person={{ id: person.id, name: person.name }} roles={roles} first={first} />
    </>
  );
}
