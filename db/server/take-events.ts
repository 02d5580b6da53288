import { sha256Hex } from "@/lib/ledger/sha256";
import { eventFromText } from "@/lib/sync/admission";
import { basisOf } from "@/lib/sync/basis";
import { envelopeHash } from "@/lib/sync/envelope-hash";
import type { EventBody } from "@/lib/sync/event";
import type { Envelope, SyncAnswer, SyncRequest } from "@/lib/sync/protocol";
import { receiptForRole } from "@/lib/sync/receipt-for-role";
import { confirmedTo } from "./backups-made";
import { tellChange } from "./changes";
import { type Database, inTransaction } from "./connection";
import { noteHeard } from "./devices";
import { withPlansKept } from "./due-plan";
import { writeEventEntry } from "./event-entry";
import { nextServerSeq, receiptOf, receivedFrom, type StoredEvent, sameEvent, storeEvent } from "./event-store";
import { type Judgement, judged, setAside } from "./judgement";
import { ledgerHead } from "./ledger-entries";
import { notePhotographs } from "./photographs";
import { rolesOf } from "./role-grants";
import { identityOf } from "./server-identity";
import { placeWaiting } from "./waiting-events";

/** Who sends, and when the request came in. */
export type Sender = { readonly account: string; readonly at: string };

type Batch = Pick<SyncRequest, "device" | "holds" | "events">;

/**
 * Takes a batch in: each event, its ledger entry, the projection and its receipt in one commit. The answer exists only
 * after the commit. An event sent before gets its first receipt again; one that can't take part is set aside, kept, and
 * blocks no other.
 */
export function takeEvents(db: Database, { device, holds, events }: Batch, sender: Sender): SyncAnswer {
  const taken = inTransaction(db, () => {
    noteHeard(db, device, Math.max(0, holds - events.length), sender.at);
    return withPlansKept(db, () => events.map((envelope) => takeSafely(db, envelope, device, sender)));
  });
  const tests = new Set(taken.flatMap(({ test }) => (test === null ? [] : [test])));
  for (const test of tests) tellChange(test);
  const { highestSeq, missing } = receivedFrom(db, device);
  const roles = new Map([...tests].map((test) => [test, rolesOf(db, sender.account, test, sender.at)]));
  const last = [...tests].at(-1);
  return {
    server: { ...identityOf(db), time: sender.at },
    results: taken.map((event) => receiptForRole(receiptOf(event), roles.get(event.test ?? "") ?? [])),
    received: events.map(envelopeHash),
    device: { highestSeq, missing },
    confirmedTo: confirmedTo(db),
    ledgerHead: last === undefined ? null : ledgerHead(db, last),
  };
}

/** A fault of our own in one event must not keep the others out: it is kept as it came, to be let in when the fault is mended. */
function takeSafely(db: Database, envelope: Envelope, sentFrom: string, sender: Sender): StoredEvent {
  try {
    return inTransaction(db, () => takeOne(db, envelope, sentFrom, sender, judged));
  } catch (error) {
    if (isOfDatabase(error)) throw error;
    console.error("An event could not be placed:", error);
    const fault = () => setAside({ type: "server-fault", message: "The server could not place it; it is kept" });
    return inTransaction(db, () => takeOne(db, envelope, sentFrom, sender, fault));
  }
}

function takeOne(db: Database, envelope: Envelope, sentFrom: string, sender: Sender, judge: typeof judged): StoredEvent {
  const bodyHash = sha256Hex(envelope.body);
  const before = sameEvent(db, envelope, bodyHash);
  if (before) return before;
  const read = eventFromText(envelope.body);
  const serverSeq = nextServerSeq(db);
  const stamp = { serverSeq, bodyHash, at: sender.at, account: sender.account };
  const judgement = read.ok ? judge(db, read.value, envelope, stamp) : setAside(read.refusal);
  const event = rowOf(read.ok ? read.value : null, envelope, { ...stamp, sentFrom }, judgement);
  storeEvent(db, event);
  if (read.ok) notePhotographs(db, read.value, serverSeq);
  writeEventEntry(db, event);
  placeWaiting(db, event);
  return event;
}

type Arrival = {
  readonly serverSeq: number;
  readonly bodyHash: string;
  readonly at: string;
  readonly account: string;
  readonly sentFrom: string;
};

function rowOf(body: EventBody | null, envelope: Envelope, arrival: Arrival, judgement: Judgement): StoredEvent {
  const { serverSeq, bodyHash, at, account, sentFrom } = arrival;
  return {
    id: body?.id ?? null,
    device: body?.device ?? sentFrom,
    seq: body?.seq ?? null,
    test: body?.test ?? null,
    type: body?.type ?? null,
    basis: body === null ? null : basisOf(body),
    ...envelope,
    serverSeq,
    bodyHash,
    sentBy: account,
    receivedAt: at,
    ...judgement,
  };
}

// a full or locked database is no fault of one event: the whole batch is undone and the phone keeps it
function isOfDatabase(error: unknown): boolean {
  return error instanceof Error && error.name === "SqliteError";
}
