import "client-only";
import { isUnsent } from "@/lib/sync/outbox";
import { mayLetGo, type PhotographState } from "@/lib/sync/photograph";
import { deviceDatabase, type HeldPhotograph } from "./device-database";

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

async function isSettled(sha256: string, confirmedSeq: number, now: number): Promise<boolean> {
  const db = deviceDatabase();
  const photograph = await db.photographs.get(sha256);
  if (!photograph) return false;
  const events = (await db.events.bulkGet([...photograph.events])).flatMap((event) => event ?? []);
  return events.length === photograph.events.length && mayLetGo({ ...photograph, events, confirmedSeq }, now);
}
