import { useLiveQuery } from "dexie-react-hooks";
import { useRef, useState } from "react";
import { dropPhotograph, keepPhotograph, photographsBeside } from "@/db/device/photographs";
import { unfinishedKey } from "@/db/device/unfinished-entries";
import type { PictureRefusal } from "./smaller-picture";

export type PhotographTrouble = PictureRefusal["type"] | "NoRoom" | "TakenBefore" | "NotKept";
export type Beside = { readonly sha256: string; readonly picture: Blob };

/** A phone that is nearly full keeps its room for readings [bytes]. */
const ROOM_FOR_READINGS = 20 * 1024 * 1024;
/** A reading is not held up by a picture for longer than this [ms]. */
const PATIENCE_MS = 4000;

/** The photographs beside one unfinished entry: kept on the phone one by one, named by the event when it is saved. */
export function usePhotographs(test: string, slotKey: string) {
  const entry = unfinishedKey(test, slotKey);
  const beside = useLiveQuery(() => besideEntry(entry), [entry]);
  const [trouble, setTrouble] = useState<PhotographTrouble | null>(null);
  const [busy, setBusy] = useState(false);
  const keeping = useRef<Promise<unknown>>(Promise.resolve());

  function take(file: File) {
    setBusy(true);
    setTrouble(null);
    keeping.current = keepPicture(file, entry).then((found) => {
      setTrouble(found);
      setBusy(false);
    });
  }

  /** Their names for the event; a store that does not answer gives none, and the reading is saved without. */
  async function names(): Promise<readonly string[]> {
    await Promise.race([keeping.current, new Promise((done) => setTimeout(done, PATIENCE_MS))]);
    const taken = await photographsBeside(entry).catch(() => []);
    return taken.map(({ sha256 }) => sha256);
  }

  return { beside: beside ?? [], busy, trouble, take, drop: (sha256: string) => void dropPhotograph(sha256).catch(() => undefined), names };
}

async function besideEntry(entry: string): Promise<Beside[]> {
  const taken = await photographsBeside(entry);
  return taken.map(({ sha256, bytes, type }) => ({ sha256, picture: new Blob([bytes], { type }) }));
}

async function keepPicture(file: File, entry: string): Promise<PhotographTrouble | null> {
  try {
    const { quota, usage } = (await navigator.storage?.estimate?.()) ?? {};
    if (quota !== undefined && usage !== undefined && quota - usage < ROOM_FOR_READINGS) return "NoRoom";
    // most readings have no photograph: their pages load without this
    const { smallerPicture } = await import("./smaller-picture");
    const smaller = await smallerPicture(file);
    if (!smaller.ok) return smaller.refusal.type;
    return (await keepPhotograph(smaller.value, entry)) ? null : "TakenBefore";
  } catch (error) {
    return isFull(error) ? "NoRoom" : "NotKept";
  }
}

function isFull(error: unknown): boolean {
  if (!(error instanceof Error)) return false;
  return error.name === "QuotaExceededError" || isFull(error.cause) || ("inner" in error && isFull(error.inner));
}
