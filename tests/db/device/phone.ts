import type { EventDraft } from "@/db/device/append-event";
import { deviceDatabase } from "@/db/device/device-database";
import { enrolledIdentity } from "@/db/device/device-identity";
import type { Slot } from "@/lib/sync/slot";
import { installWebLocks } from "./web-locks";

export const test1 = "5b3f2c1e-0a4d-4b8e-9c55-6f0a1d2e3c41";
const author = "5b3f2c1e-0a4d-4b8e-9c55-6f0a1d2e3c42";
const reading1 = "5b3f2c1e-0a4d-4b8e-9c55-6f0a1d2e3c43";

/** A phone just enrolled, with nothing on it. */
export async function freshPhone() {
  installWebLocks();
  await deviceDatabase().delete();
  await deviceDatabase().open();
  return enrolledIdentity("Blue phone, aft");
}

export const atMove1: Slot = { kind: "batten", move: 1, repeat: 1, station: "A", series: 1 };

/** A batten reading as the page hands it over. */
export function batten(valueMm: number, slot: Slot = atMove1, reading = reading1): EventDraft {
  const payload = { mode: "settled" as const, valuesMm: [valueMm] };
  return { ...act, type: "record", reading, base: null, slot, payload, source: "station" };
}

export function correction(valueMm: number, base: string, reading = reading1): EventDraft {
  const payload = { mode: "settled" as const, valuesMm: [valueMm] };
  return { ...act, type: "correct", reading, base, slot: atMove1, payload, source: "station" };
}

export function takenBack(base: string, reading = reading1): EventDraft {
  return { ...act, type: "void", reading, base, slot: atMove1, payload: {}, source: null, reason: "Mistyped" };
}

const act = { test: test1, jobTag: "tag", author, capturedAt: "2026-05-04T09:12:31.250Z", reason: null };
