import "client-only";
import type { JobSheet } from "@/lib/sync/job-sheet";
import { deviceDatabase, type HeldJobSheet } from "./device-database";

/** The sheets on this phone, the latest test first. */
export async function jobSheets(): Promise<HeldJobSheet[]> {
  const held = await deviceDatabase().jobSheets.toArray();
  return held.sort((a, b) => b.sheet.test.date.localeCompare(a.sheet.test.date));
}

export function jobSheet(test: string): Promise<HeldJobSheet | undefined> {
  return deviceDatabase().jobSheets.get(test);
}

export async function keepJobSheet(sheet: JobSheet, etag: string | null): Promise<void> {
  await deviceDatabase().jobSheets.put({ test: sheet.test.id, sheet, etag, fetchedAt: new Date().toISOString() });
}
