import { and, desc, eq } from "drizzle-orm";
import { usualAgreement } from "@/lib/sync/agreement";
import type { SlotRules } from "@/lib/sync/slot-projection";
import { ledgerEntries } from "../schema/ledger";
import { planSettings } from "../schema/plan";
import { tests } from "../schema/tests";
import type { Database } from "./connection";

/** The limits of a test within which readings agree, and when it was reconciled. */
export function slotRules(db: Database, test: string): SlotRules {
  const settings = db.select({ settings: planSettings.settings }).from(planSettings).where(eq(planSettings.test, test)).get()?.settings;
  return { limits: settings?.agreement ?? usualAgreement, reconciledAt: reconciledAt(db, test) };
}

function reconciledAt(db: Database, test: string): string | null {
  const state = db.select({ state: tests.state }).from(tests).where(eq(tests.id, test)).get()?.state;
  if (state !== "reconciled" && state !== "issued") return null;
  const changes = db
    .select({ at: ledgerEntries.at, after: ledgerEntries.after })
    .from(ledgerEntries)
    .where(and(eq(ledgerEntries.chain, test), eq(ledgerEntries.what, "test.state")))
    .orderBy(desc(ledgerEntries.seq))
    .all();
  return changes.find(({ after }) => after === "reconciled")?.at ?? null;
}
