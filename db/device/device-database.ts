import "client-only";
import Dexie, { type Table } from "dexie";
import type { JobSheet } from "@/lib/sync/job-sheet";
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
export type KeptAnswer = { readonly key: "sending"; readonly value: unknown };

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
