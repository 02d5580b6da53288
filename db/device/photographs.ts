import "client-only";
import { isUnsent } from "@/lib/sync/outbox";
import { mayLetGo, type PhotographState } from "@/lib/sync/photograph";
import { deviceDatabase, type HeldPhotograph } from "./device-database";
import { keptTrying } from "./kept-trying";

/** Bytes of a picture as they are sent. */
export type TakenPhotograph = { readonly sha256: string; readonly type: string; readonly bytes: Uint8Array<ArrayBuffer> };

/**
 * Keeps a photograph on this phone beside an unfinished entry, before the event that will name it; answered after the transaction has
 * completed. False: the same bytes stand with a saved reading already. Throws `StorageFailed` where the store refuses.
 */
export function keepPhotograph({ sha256, type, bytes }: TakenPhotograph, entry: string): Promise<boolean> {
  return keptTrying(async () => {
    const db = deviceDatabase();
    return db.transaction("rw", db.photographs, async () => {
      const known = await db.photographs.get(sha256);
      if (known && known.state !== "unfinished") return false;
      await db.photographs.put({ ...fresh, sha256, type, bytes, entry, takenAt: new Date().toISOString() });
      return true;
    });
  });
}

/** Takes a photograph off an entry that is not saved; one that a saved reading names stays. */
export async function dropPhotograph(sha256: string): Promise<void> {
  const db = deviceDatabase();
  await db.transaction("rw", db.photographs, async () => {
    if ((await db.photographs.get(sha256))?.state === "unfinished") await db.photographs.delete(sha256);
  });
}

/** The photographs taken beside an unfinished entry, in the order taken. */
export async function photographsBeside(entry: string): Promise<HeldPhotograph[]> {
  const taken = await deviceDatabase().photographs.where("entry").equals(entry).sortBy("takenAt");
  return taken.filter(({ state }) => state === "unfinished");
}

/** Every photograph that no server has answered for, with its bytes. */
export function owedPhotographs(): Promise<HeldPhotograph[]> {
  return deviceDatabase().photographs.where("state").equals("saved").sortBy("takenAt");
}

/** How many photographs of saved readings the server has not answered for. */
export function photographsOwed(): Promise<number> {
  return deviceDatabase().photographs.where("state").equals("saved").count();
}

/** The photographs owed to the server. */
export function photographsToSend(): Promise<string[]> {
  return deviceDatabase().photographs.where("state").equals("saved").primaryKeys();
}

/** A photograph to be sent now; null where its event has to go first, or where it has become settled meanwhile. */
export async function announcedPhotograph(sha256: string): Promise<HeldPhotograph | null> {
  const photograph = await deviceDatabase().photographs.get(sha256);
  if (photograph?.state !== "saved") return null;
  const naming = await deviceDatabase().events.bulkGet([...photograph.events]);
  return naming.some((event) => event !== undefined && !isUnsent(event)) ? photograph : null;
}

/** The server has the photograph. */
export async function notePhotographSent(sha256: string, at: number): Promise<void> {
  const db = deviceDatabase();
  await db.transaction("rw", db.photographs, db.counters, db.identity, async () => {
    const identity = await db.identity.get("self");
    const sentAtSeq = identity ? ((await db.counters.get(identity.device))?.last ?? 0) : null;
    await db.photographs.update(sha256, { state: "on-server", sentAt: at, sentAtSeq, refusal: null });
  });
}

/** The server would not have the photograph as it is; it stays here, and is offered again when a person asks. */
export async function notePhotographRefused(sha256: string, refusal: string): Promise<void> {
  await deviceDatabase().photographs.update(sha256, { refusal });
}

/** A server restored from an older backup may have lost photographs: each is offered again. */
export async function oweAllPhotographs(): Promise<void> {
  await deviceDatabase()
    .photographs.where("state")
    .equals("on-server")
    .modify({ state: "saved" satisfies PhotographState, sentAt: null, sentAtSeq: null });
}

/** Photographs that this phone may let go of, once the server says again that it has them. */
export async function photographsToLetGo(now: number): Promise<string[]> {
  const db = deviceDatabase();
  const names = await db.photographs.where("state").equals("on-server").primaryKeys();
  if (names.length === 0) return [];
  const device = (await db.identity.get("self"))?.device;
  const confirmed = await db.events.where("state").equals("confirmed").toArray();
  const confirmedSeq = Math.max(0, ...confirmed.filter((event) => event.device === device).map(({ seq }) => seq));
  const checked = await Promise.all(names.map(async (name) => ((await isSettled(name, confirmedSeq, now)) ? [name] : [])));
  return checked.flat();
}

export async function letGoPhotograph(sha256: string): Promise<void> {
  await deviceDatabase().photographs.delete(sha256);
}

const fresh = { state: "unfinished", events: [], refusal: null, sentAt: null, sentAtSeq: null } as const;

async function isSettled(sha256: string, confirmedSeq: number, now: number): Promise<boolean> {
  const db = deviceDatabase();
  const photograph = await db.photographs.get(sha256);
  if (!photograph) return false;
  const events = (await db.events.bulkGet([...photograph.events])).flatMap((event) => event ?? []);
  return events.length === photograph.events.length && mayLetGo({ ...photograph, events, confirmedSeq }, now);
}
