import { eventFromText, isFitting } from "@/lib/sync/admission";
import { basisOf, isLettingIn } from "@/lib/sync/basis";
import type { EventBody } from "@/lib/sync/event";
import type { QuarantineCode } from "@/lib/sync/protocol";
import type { Slot } from "@/lib/sync/slot";
import { mayStandOnBase } from "./admission-facts";
import type { Database } from "./connection";
import { duePlan } from "./due-plan";
import { eventById, eventsOn, type StoredEvent } from "./event-store";
import { displaceEvent, isPlaced, isPlacedCopy, placeEvent, slotOfEvent } from "./slot-standing";

/** Set aside only because of what it stands on: it follows when that is let in. */
const followsItsBase: readonly (QuarantineCode | null)[] = ["base-quarantined", "unknown-slot"];

/**
 * After an event has come into the file: lets in what it lets in, lets it in where an act that does so was here before,
 * and gives everything that waited for it its place.
 */
export function placeWaiting(db: Database, arrived: StoredEvent): void {
  const read = eventFromText(arrived.body);
  if (!read.ok || arrived.id === null) return;
  if (arrived.outcome === "quarantined") letInByEarlier(db, arrived.id);
  else if (isLettingIn(read.value)) letIn(db, read.value.payload.event, read.value.slot);
  else placeFollowers(db, arrived.id, new Set());
}

function letInByEarlier(db: Database, event: string): void {
  const acts = eventsOn(db, event).filter(({ id }) => id !== null && isPlaced(db, id));
  const [first] = acts.flatMap(({ body }) => lettingIn(body));
  if (first) letIn(db, event, first.slot);
}

function lettingIn(body: string) {
  const read = eventFromText(body);
  return read.ok && isLettingIn(read.value) ? [read.value] : [];
}

function letIn(db: Database, event: string, slot: Slot | null): void {
  const target = eventById(db, event);
  if (!target || isPlaced(db, event)) return;
  const body = bodyOf(target);
  if (body === null) return;
  placeEvent(db, { body, ...stampOf(target) }, slot ?? slotOfEvent(db, body));
  placeFollowers(db, event, new Set());
}

/** Acts on an event stand in its slot, wherever they asked to stand while it was not there. */
function placeFollowers(db: Database, basis: string, seen: Set<string>): void {
  if (seen.has(basis)) return;
  seen.add(basis);
  for (const follower of eventsOn(db, basis)) {
    const body = bodyOf(follower);
    if (body === null || isLettingIn(body) || basisOf(body) !== basis || !mayFollow(db, follower)) continue;
    if (!mayStandOnBase(db, body, follower.receivedAt)) {
      displaceEvent(db, body.id);
      continue;
    }
    const slot = slotOfEvent(db, body);
    const plan = duePlan(db, body.test)?.plan;
    if (slot !== null && plan && !isFitting(body, slot, plan)) continue;
    placeEvent(db, { body, ...stampOf(follower) }, slot);
    placeFollowers(db, body.id, seen);
  }
}

/** A broken copy bears the name of an event that is placed, and must not take its place. */
function mayFollow(db: Database, { id, outcome, code, serverSeq }: StoredEvent): boolean {
  if (id === null) return false;
  return outcome !== "quarantined" || followsItsBase.includes(code) || isPlacedCopy(db, id, serverSeq);
}

function bodyOf({ body }: StoredEvent): EventBody | null {
  const read = eventFromText(body);
  return read.ok ? read.value : null;
}

function stampOf({ serverSeq, receivedAt }: StoredEvent) {
  return { serverSeq, receivedAt };
}
