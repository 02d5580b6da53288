import "client-only";
import type { EventDraft } from "./append-event";
import { deviceDatabase } from "./device-database";
import { publicKeyOf } from "./device-identity";

/**
 * All events of this phone in one file, importable in the wheelhouse when no network ever comes. The bodies are the exact
 * bytes that were signed. `unsaved` holds what the store refused: it was never numbered, so it must be typed in.
 */
export async function exportFile(unsaved: EventDraft | null = null): Promise<File> {
  const text = JSON.stringify({ format: "battenbook-phone", version: 1, exportedAt: new Date().toISOString(), ...(await held()), unsaved });
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
