import { useLiveQuery } from "dexie-react-hooks";
import { deviceIdentity, type Person } from "@/db/device/device-identity";
import { jobSheet } from "@/db/device/job-sheets";
import type { JobSheet } from "@/lib/sync/job-sheet";

export type SheetHere = { readonly sheet: JobSheet; readonly person: Person; readonly fetchedAt: string };

/** The sheet of a test on this phone and the person who reads with it; null where there is none, undefined until the store has answered. */
export function useJobSheet(test: string | null): SheetHere | null | undefined {
  return useLiveQuery(async () => {
    const [held, identity] = await Promise.all([test ? jobSheet(test) : undefined, deviceIdentity()]);
    return held ? { sheet: held.sheet, person: identity?.person ?? held.sheet.person, fetchedAt: held.fetchedAt } : null;
  }, [test]);
}
