import "client-only";
import Dexie, { type Table } from "dexie";
import type { JobSheet } from "@/lib/sync/job-sheet";
import type { PhotographState } from "@/lib/sync/photograph";
import type { DeviceIdentity } from "./device-identity";
import type { HeldEvent } from "./held-event";

/** An entry being typed, kept per slot so that a reload, a call or a dead battery loses no digit. */
export type UnfinishedEntry = {
  readonly key: string;
  readonly test: string;
  readonly slotKey: string;
  readonly entry: unknown;
  readonly touchedAt: string;
};

/** A job sheet with the tag the server gave its bytes. */
export type HeldJobSheet = { readonly test: string; readonly sheet: JobSheet; readonly etag: string | null; readonly fetchedAt: string };

/** A number, text or mark that belongs to this phone alone: cautions confirmed, the station read here. */
export type DeviceNote = { readonly key: string; readonly value: string };

/** The last number given out by a device; the next event takes the one after it. */
export type SeqCounter = { readonly device: string; readonly last: number };

/** What the last attempt to send came to, shared by the page and the service worker. */
export type KeptAnswer = { readonly key: "sending" | "photographs"; readonly value: unknown };

/** A photograph under the hash of its bytes, and where it stands on its way. */
export type HeldPhotograph = {
  readonly sha256: string;
  readonly type: string;
  readonly bytes: Uint8Array<ArrayBuffer>;
  readonly takenAt: string;
  /** key of the unfinished entry it was taken beside */
  readonly entry: string;
  readonly state: PhotographState;
  /** every event of this phone that names it */
  readonly events: readonly string[];
  /** why the server would not have it; null: it was not refused */
  readonly refusal: string | null;
  /** when the server answered for it [ms since 1970], and this phone's last number then */
  readonly sentAt: number | null;
  readonly sentAtSeq: number | null;
};

/** Chrome's default has been relaxed for years: "saved" must mean that the bytes are on the disk. */
const options = { chromeTransactionDurability: "strict", cache: "disabled" } as const;

export class DeviceDatabase extends Dexie {
  declare readonly events: Table<HeldEvent, string>;
  declare readonly counters: Table<SeqCounter, string>;
  declare readonly unfinished: Table<UnfinishedEntry, string>;
  declare readonly jobSheets: Table<HeldJobSheet, string>;
  declare readonly identity: Table<DeviceIdentity, string>;
  declare readonly lastAnswer: Table<KeptAnswer, string>;
  declare readonly notes: Table<DeviceNote, string>;
  declare readonly photographs: Table<HeldPhotograph, string>;

  constructor(name = "battenbook") {
    super(name, options);
    this.version(1).stores({
      events: "id, &[device+seq], state, test, [test+slotKey]",
      counters: "device",
      unfinished: "key, test",
      jobSheets: "test",
      identity: "key",
      lastAnswer: "key",
      notes: "key",
    });
    // the tables of before stay as they are
    this.version(2).stores({ photographs: "sha256, state, entry" });
  }
}

let current: DeviceDatabase | null = null;

/** The phone's store; one connection per page or worker. */
export function deviceDatabase(): DeviceDatabase {
  current ??= new DeviceDatabase();
  return current;
}

/** The same store on a fresh connection: WebKit kills connections in the background, and only a fresh open heals. */
export async function freshConnection(): Promise<DeviceDatabase> {
  const db = deviceDatabase();
  db.close({ disableAutoOpen: false });
  await db.open();
  return db;
}
