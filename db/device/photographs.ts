import "client-only";
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

const fresh = { state: "unfinished", events: [], refusal: null, sentAt: null, sentAtSeq: null } as const;
