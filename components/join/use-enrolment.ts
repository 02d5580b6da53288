import { useState } from "react";
import { type DeviceIdentity, enrolledIdentity, publicKeyOf, renewedIdentity, updateIdentity } from "@/db/device/device-identity";
import { isForked } from "@/db/device/event-queue";
import { jobSheets } from "@/db/device/job-sheets";

export type Step = "idle" | "signing-in" | "fetching" | "keeping" | "done" | "refused";
export type Enrolment = {
  readonly step: Step;
  readonly sentence: string | null;
  readonly tests: number;
  readonly persisted: boolean;
  readonly signed: boolean;
  /** the pages are on this phone */
  readonly pages: boolean;
};

const PAGES_PATIENCE_MS = 120_000;
const nothing: Enrolment = { step: "idle", sentence: null, tests: 0, persisted: false, signed: false, pages: false };

/** Lets this phone in: keys, sign-in by code, job sheets, storage, pages. Each step says where it stands. */
export function useEnrolment() {
  const [state, setState] = useState<Enrolment>(nothing);
  const enrol = async (code: string, deviceName: string) => {
    setState({ ...nothing, step: "signing-in" });
    try {
      await enrolled(code, deviceName, setState);
    } catch (error) {
      setState({ ...nothing, step: "refused", sentence: error instanceof Error ? error.message : "The server did not answer." });
    }
  };
  return { ...state, enrol };
}

async function enrolled(code: string, deviceName: string, tell: (state: Enrolment) => void): Promise<void> {
  const identity = await ownIdentity(deviceName);
  const signed = identity.keys !== null;
  const { signedInByCode } = await import("@/worker/sign-in");
  await signedInByCode({ code, device: identity.device, deviceName, publicKey: JSON.stringify(await publicKeyOf(identity)) });
  tell({ ...nothing, step: "fetching", signed });
  // whoever enrols now is the reader from now on; the first sheet names the person
  await updateIdentity({ person: null, server: null });
  const { fetchAllJobSheets } = await import("@/worker/job-sheet-refresh");
  await fetchAllJobSheets();
  const tests = (await jobSheets()).length;
  tell({ ...nothing, step: "keeping", tests, signed });
  const persisted = (await navigator.storage?.persist?.()) ?? false;
  await updateIdentity({ persisted });
  const pages = await pagesKept();
  tell({ step: "done", sentence: null, tests, persisted, signed, pages });
}

async function ownIdentity(deviceName: string): Promise<DeviceIdentity> {
  const identity = await enrolledIdentity(deviceName);
  return (await isForked(identity.device)) ? ((await renewedIdentity()) ?? identity) : identity;
}

// a worker is ready once every page and file is in its store
async function pagesKept(): Promise<boolean> {
  if (!(await navigator.serviceWorker?.getRegistration())) return false;
  const late = new Promise<false>((give) => setTimeout(() => give(false), PAGES_PATIENCE_MS));
  return Promise.race([navigator.serviceWorker.ready.then(() => true), late]);
}
