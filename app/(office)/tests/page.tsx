import type { Metadata } from "next";
import { isOffice, requirePerson } from "@/app/access";
import { backupNewsFor } from "@/app/backup-news";
import { BackupPanel } from "@/components/backups/backup-panel";
import { ImportRecord } from "@/components/tests/import-record";
import { TestsTable } from "@/components/tests/tests-table";
import { PageTitle } from "@/components/ui/page-title";
import { database } from "@/db/server/connection";
import { testsOf } from "@/db/server/tests";

export const metadata: Metadata = { title: "Tests" };

export default async function Page() {
  const person = await requirePerson("/tests");
  return (
    <>
      <PageTitle title="Tests">{isOffice(person) ? <ImportRecord /> : null}</PageTitle>
      <TestsTable tests={testsOf(database(), person.id, new Date().toISOString())} />
      <BackupPanel first={backupNewsFor(person)} />
    </>
  );
}
