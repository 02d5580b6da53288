import { asc, eq, inArray } from "drizzle-orm";
import { canonicalJson } from "@/lib/ledger/canonical-json";
import { sha256Hex } from "@/lib/ledger/sha256";
import type { TestRecord } from "@/lib/record/test-record";
import { type EventBody, eventBodySchema } from "@/lib/sync/event";
import { accounts } from "../schema/accounts";
import { devices } from "../schema/devices";
import { events } from "../schema/events";
import { files } from "../schema/files";
import type { Act } from "./act";
import { type Database, inTransaction } from "./connection";
import { ledgerOf, writeEntry } from "./ledger-entries";
import { some } from "./plan-rows";
import { recordOf } from "./record-as-it-stands";
import { peopleOf } from "./role-grants";

/** The record file of a test: everything that another server or another office needs, the chain included. The export stands in the ledger. */
export function exportedRecord(db: Database, test: string, act: Act): TestRecord {
  return inTransaction(db, () => {
    const record = recordOf(db, test);
    writeEntry(db, test, { ...act, what: "record.export", contentHash: sha256Hex(canonicalJson(record)) });
    const bodies = bodiesOf(db, test);
    const used = [...new Set(bodies.map(({ device }) => device))];
    return {
      ...record,
      people: peopleOf(db, test, act.at),
      ...some(
        "devices",
        used.flatMap((id) => deviceWithKey(db, id)),
      ),
      ...some("files", filesOf(db, test)),
      ...some("attestations", attestationsOf(db, bodies)),
      ...some(
        "events",
        bodies.map(({ body, signature }) => ({ body, signature })),
      ),
      ledger: ledgerOf(db, test),
    };
  });
}

type Sent = { readonly body: string; readonly device: string; readonly signature: string | null };

function bodiesOf(db: Database, test: string): Sent[] {
  const { body, device, signature } = events;
  return db.select({ body, device, signature }).from(events).where(eq(events.test, test)).orderBy(asc(events.serverSeq)).all();
}

function deviceWithKey(db: Database, id: string): { id: string; publicKey: Record<string, unknown> }[] {
  const device = db.select().from(devices).where(eq(devices.id, id)).get();
  return device?.publicKey ? [{ id, publicKey: device.publicKey }] : [];
}

function filesOf(db: Database, test: string): NonNullable<TestRecord["files"]> {
  const { sha256, type, of } = files;
  return db.select({ sha256, type, of }).from(files).where(eq(files.test, test)).orderBy(asc(files.addedAt)).all();
}

function attestationsOf(db: Database, bodies: readonly Sent[]): NonNullable<TestRecord["attestations"]> {
  const attests = bodies.flatMap(({ body }) => attestIn(body));
  const names = new Map(
    db
      .select({ id: accounts.id, name: accounts.name })
      .from(accounts)
      .where(
        inArray(
          accounts.id,
          attests.map(({ author }) => author),
        ),
      )
      .all()
      .map(({ id, name }) => [id, name]),
  );
  return attests.map(({ author, capturedAt, payload }) => ({
    role: "witness",
    name: names.get(author) ?? author,
    at: capturedAt,
    head: payload.head,
  }));
}

function attestIn(body: string): Extract<EventBody, { type: "attest" }>[] {
  const read = eventBodySchema.safeParse(JSON.parse(body));
  return read.success && read.data.type === "attest" ? [read.data] : [];
}
