import type { Metadata } from "next";
import { allButReaders, requireRole } from "@/app/access";
import { LedgerPage } from "@/components/ledger/ledger-page";
import { PageTitle } from "@/components/ui/page-title";
import { database } from "@/db/server/connection";
import { ledgerPage } from "@/db/server/ledger-entries";
import { verifiedChain } from "@/db/server/verify-ledger";

export const metadata: Metadata = { title: "Ledger" };

type Props = { params: Promise<{ id: string }>; searchParams: Promise<{ before?: string }> };
const most = 200;

export default async function Page({ params, searchParams }: Props) {
  const [{ id }, { before }] = await Promise.all([params, searchParams]);
  const { test } = await requireRole(id, allButReaders, `/tests/${id}/ledger`);
  const entries = ledgerPage(database(), id, Number(before) || null, most);
  const last = entries.at(-1)?.seq ?? 1;
  return (
    <>
      <PageTitle title="Ledger" over={`${test.vesselCopy.vessel.name} · ${test.title}`} />
      <LedgerPage test={id} found={verifiedChain(database(), id)} entries={entries} earlier={last > 1 ? last : null} />
    </>
  );
}
