import { useLiveQuery } from "dexie-react-hooks";
import { type DeviceIdentity, deviceIdentity } from "@/db/device/device-identity";

/** Who this phone is; null before its enrolment, undefined until the store has answered. */
export function useIdentity(): DeviceIdentity | null | undefined {
  return useLiveQuery(async () => (await deviceIdentity()) ?? null);
}
