"use client";

import { useLiveQuery } from "dexie-react-hooks";
import { useState } from "react";
import { z } from "zod";
import { deviceIdentity, enrolledIdentity, publicKeyOf, updateIdentity } from "@/db/device/device-identity";
import { jobSheet } from "@/db/device/job-sheets";
import { fetchAllJobSheets } from "@/worker/job-sheet-refresh";

export type LeadDevice =
  | { readonly state: "asking" }
  | { readonly state: "ready"; readonly jobTag: string }
  | { readonly state: "stranger"; readonly busy: boolean; readonly refused: string | null };

const refusedSchema = z.object({ error: z.string() });

/** This device as one that may give orders: it has its own key and number, and the job sheet of this test for this person. */
export function useLeadDevice(test: string, person: string) {
  const [busy, setBusy] = useState(false);
  const [refused, setRefused] = useState<string | null>(null);
  const jobTag = useLiveQuery(() => jobTagFor(test, person), [test, person]);
  const prepare = async () => {
    setBusy(true);
    setRefused(await whyNotPrepared());
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

/** Gives this device a key and a number that the server knows; null when it may give orders from now on. */
async function whyNotPrepared(): Promise<string | null> {
  try {
    const identity = await enrolledIdentity("Wheelhouse");
    const device = { device: identity.device, name: identity.deviceName, publicKey: await publicKeyOf(identity) };
    const headers = { "content-type": "application/json" };
    const response = await fetch("/api/v1/devices", { method: "POST", headers, body: JSON.stringify(device) });
    if (!response.ok) return sentenceOf(await response.json());
    await updateIdentity({ person: null, server: null });
    return (await fetchAllJobSheets()) > 0
      ? null
      : "The server gives this device no job sheet: the test may have been issued or handed over.";
  } catch {
    return "The server does not answer; it has to know this device once.";
  }
}

function sentenceOf(answer: unknown): string {
  const refused = refusedSchema.safeParse(answer);
  return refused.success ? refused.data.error : "The server does not take this device, and did not say why.";
}
