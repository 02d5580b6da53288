import { eventFromText } from "@/lib/sync/admission";
import type { EventBody } from "@/lib/sync/event";
import type { Database } from "./connection";
import { eventById, type StoredEvent } from "./event-store";
import { writeEntry } from "./ledger-entries";
import { rolesOf } from "./role-grants";
import { isTestKnown } from "./tests";

/**
 * The ledger's entry for an event that has come in, in the chain of its test. What was set aside is entered under who
 * sent it: what its body says of itself is not believed.
 */
export function writeEventEntry(db: Database, event: StoredEvent): void {
  const read = eventFromText(event.body);
  const chain = event.test !== null && isTestKnown(db, event.test) ? event.test : null;
  const arrived = { at: event.receivedAt, device: event.device, contentHash: event.bodyHash };
  if (!read.ok || event.outcome === "quarantined") {
    const { serverSeq, id, code, message } = event;
    writeEntry(db, chain, { ...arrived, by: event.sentBy, what: "event.set-aside", after: { serverSeq, event: id, code, message } });
    return;
  }
  const { author, type, reason, capturedAt, test } = read.value;
  const role = rolesOf(db, author, test, event.receivedAt).join(", ");
  const change = { before: saidBefore(db, read.value), after: saidNow(event, read.value) };
  writeEntry(db, chain, { ...arrived, by: author, role, what: type, ...change, reason, capturedAt });
}

function saidNow({ serverSeq, outcome }: StoredEvent, { id, slot, source, payload }: EventBody) {
  return { serverSeq, outcome, event: id, slot, source, value: payload };
}

function saidBefore(db: Database, { base }: EventBody) {
  if (base === null) return null;
  return [base].flat().map((id) => {
    const stored = eventById(db, id);
    const read = stored ? eventFromText(stored.body) : null;
    return { event: id, value: read?.ok ? read.value.payload : null };
  });
}
