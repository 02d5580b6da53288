import "client-only";
import { PHONE_FILE_PHOTOGRAPH_BYTES } from "@/lib/sync/batch-limits";
import type { EventDraft } from "./append-event";
import { deviceDatabase, type HeldPhotograph } from "./device-database";
import { publicKeyOf } from "./device-identity";
import { owedPhotographs } from "./photographs";

/**
 * All events of this phone in one file, importable in the wheelhouse when no network ever comes. The bodies are the exact
 * bytes that were signed. `unsaved` holds what the store refused: it was never numbered, so it must be typed in. Photographs that no
 * server has are in it, as many as a file can carry; it says how many stay on the phone.
 */
export async function exportFile(unsaved: EventDraft | null = null): Promise<File> {
  const text = JSON.stringify({
    format: "battenbook-phone",
    version: 1,
    exportedAt: new Date().toISOString(),
    ...(await held()),
    ...(await photographs()),
    unsaved,
  });
  return new File([text], `battenbook-phone-${new Date().toISOString().slice(0, 16).replaceAll(":", "")}.json`, {
    type: "application/json",
  });
}

async function held() {
  try {
    const db = deviceDatabase();
    const identity = await db.identity.get("self");
    const events = await db.events.orderBy("[device+seq]").toArray();
    return {
      device: identity?.device ?? null,
      deviceName: identity?.deviceName ?? null,
      publicKey: identity ? await publicKeyOf(identity) : null,
      events: events.map(({ envelope }) => envelope),
    };
  } catch {
    // the store can't be read: the file still carries what stands on the screen
    return { device: null, deviceName: null, publicKey: null, events: [] };
  }
}

async function photographs() {
  const owed = await owedPhotographs().catch(() => []);
  const carried: HeldPhotograph[] = [];
  let size = 0;
  for (const photograph of owed) {
    size += photograph.bytes.length;
    if (size <= PHONE_FILE_PHOTOGRAPH_BYTES) carried.push(photograph);
  }
  return {
    photographs: carried.map(({ sha256, type, bytes }) => ({ sha256, type, base64: base64(bytes) })),
    photographsLeft: owed.length - carried.length,
  };
}

// in pieces: a call can't take a photograph's bytes as its arguments
function base64(bytes: Uint8Array): string {
  const pieces: string[] = [];
  for (let i = 0; i < bytes.length; i += 0x8000) pieces.push(String.fromCharCode(...bytes.subarray(i, i + 0x8000)));
  return btoa(pieces.join(""));
}
