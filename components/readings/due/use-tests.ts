import { useLiveQuery } from "dexie-react-hooks";
import { deviceIdentity } from "@/db/device/device-identity";
import { jobSheets } from "@/db/device/job-sheets";
import type { SheetHere } from "../task/use-job-sheet";

/** Every test on this phone with its sheet; undefined until the store has answered. */
export function useTests(): readonly SheetHere[] | undefined {
  return useLiveQuery(async () => {
    const [sheets, identity] = await Promise.all([jobSheets(), deviceIdentity()]);
    return sheets.map(({ sheet, fetchedAt }) => ({ sheet, person: identity?.person ?? sheet.person, fetchedAt }));
  });
}
