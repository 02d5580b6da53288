"use client";

import { useLiveQuery } from "dexie-react-hooks";
import { useState } from "react";
import { signedIn } from "@/components/join/signed-in";
import { deviceIdentity, enrolledIdentity, publicKeyOf, updateIdentity } from "@/db/device/device-identity";
import { jobSheet } from "@/db/device/job-sheets";
import { fetchAllJobSheets } from "@/worker/job-sheet-refresh";
import type { MakeCode } from "./use-enrolment-codes";

export type LeadDevice =
  | { readonly state: "asking" }
  | { readonly state: "ready"; readonly jobTag: string }
  | { readonly state: "stranger"; readonly busy: boolean; readonly refused: string | null };

type Lead = { readonly test: string; readonly person: { readonly id: string; readonly name: string }; readonly role: "lead" | "engineer" };

/** This device as one that may give orders: it has its own key and number, and the job sheet of this test for this person. */
export function useLeadDevice({ test, person, role }: Lead, makeCode: MakeCode) {
  const [busy, setBusy] = useState(false);
  const [refused, setRefused] = useState<string | null>(null);
  const jobTag = useLiveQuery(() => jobTagFor(test, person.id), [test, person.id]);
  const prepare = async () => {
    setBusy(true);
    setRefused(await whyNotPrepared({ personName: person.name, role, account: person.id }, makeCode));
    setBusy(false);
  };
  return { device: deviceFrom(jobTag, busy, refused), prepare };
}

function deviceFrom(jobTag: string | null | undefined, busy: boolean, refused: string | null): LeadDevice {
  if (jobTag === undefined) return { state: "asking" };
  return jobTag === null ? { state: "stranger", busy, refused } : { state: "ready", jobTag };
}

async function jobTagFor(test: string, person: string): Promise<string | null> {
  const identity = await deviceIdentity();
  const held = await jobSheet(test);
  return identity && held?.sheet.person.id === person ? held.sheet.tag : null;
}

/** Enrols this device by a code of its own, as a phone is; null when it may give orders from now on. */
async function whyNotPrepared(given: Parameters<MakeCode>[0], makeCode: MakeCode): Promise<string | null> {
  try {
    const made = await makeCode(given);
    if ("refused" in made) return made.refused;
    const deviceName = "Wheelhouse";
    const identity = await enrolledIdentity(deviceName);
    const publicKey = JSON.stringify(await publicKeyOf(identity));
    await signedIn({ code: made.code, device: identity.device, deviceName, publicKey });
    await updateIdentity({ person: null, server: null });
    await fetchAllJobSheets();
    return null;
  } catch (error) {
    return error instanceof Error ? error.message : "This device could not be made ready.";
  }
}
