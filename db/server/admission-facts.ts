import { createPublicKey, type KeyObject, verify } from "node:crypto";
import { type AdmissionFacts, wheelhouse } from "@/lib/sync/admission";
import { basisOf } from "@/lib/sync/basis";
import { capturedAt } from "@/lib/sync/captured-at";
import type { EventBody } from "@/lib/sync/event";
import type { Envelope } from "@/lib/sync/protocol";
import type { Database } from "./connection";
import { type Device, deviceById, isHolder } from "./devices";
import { duePlan } from "./due-plan";
import { eventById, genuineEventById, isIdTaken, isSeqTaken } from "./event-store";
import { isRoleHeldAt, rolesOf } from "./role-grants";
import { isPlaced, slotOfEvent } from "./slot-standing";

/** What this server knows of an event's sender and of what stands already, at the moment it arrives. */
export function admissionFacts(
  db: Database,
  event: EventBody,
  { envelope, bodyHash }: { envelope: Envelope; bodyHash: string },
  { account, at }: { account: string; at: string },
): AdmissionFacts {
  const device = deviceById(db, event.device);
  return {
    device: { isKnown: device !== undefined, isRevoked: device?.revokedAt != null, hasKey: device?.publicKey != null },
    isSignatureGood: isSignatureGood(device, envelope),
    isIdTakenByOtherBytes: isIdTaken(db, event.id, bodyHash),
    isSeqTaken: isSeqTaken(db, event.device, event.seq, bodyHash),
    isAuthorHolder: isHolder(db, event.device, event.author),
    isSenderTrusted: isHolder(db, event.device, account) || isRoleHeldAt(db, account, event.test, wheelhouse, at),
    rolesHeld: rolesOf(db, event.author, event.test, momentOf(event, device, at)),
    plan: duePlan(db, event.test) ?? null,
    base: baseFacts(db, event),
  };
}

/**
 * Whether an act may stand on its base, now that both are here: a reader corrects and takes back only what is his own. An
 * act that came before its base could not be judged by it.
 */
export function mayStandOnBase(db: Database, event: EventBody, receivedAt: string): boolean {
  if (event.type !== "correct" && event.type !== "void") return true;
  const base = eventById(db, event.base);
  if (!base || authorOf(base.body) === event.author) return true;
  return isRoleHeldAt(db, event.author, event.test, wheelhouse, momentOf(event, deviceById(db, event.device), receivedAt));
}

/** The act's moment by the server's clock, never before the phone was let in nor after the event arrived: a wrong clock is no crime. */
function momentOf(event: EventBody, device: Device | undefined, at: string): string {
  const moment = Math.min(capturedAt(event), Date.parse(at));
  const enrolled = device ? Date.parse(device.enrolledAt) : moment;
  return new Date(Math.max(moment, enrolled)).toISOString();
}

/** Null where nothing is signed or no key is known; a signature over other bytes is false. Source: FIPS 186-5, ECDSA on P-256. */
export function isSignatureGood(device: Pick<Device, "publicKey"> | undefined, envelope: Envelope): boolean | null {
  if (!device?.publicKey || envelope.signature === null) return null;
  const key = keyOf(device.publicKey);
  const signature = Buffer.from(envelope.signature, "base64url");
  return verify("sha256", Buffer.from(envelope.body, "utf8"), { key, dsaEncoding: "ieee-p1363" }, signature);
}

const keys = new Map<string, KeyObject>();
const MOST_KEYS = 500;

/** A phone sends many events: its key is read once. */
function keyOf(publicKey: Record<string, unknown>): KeyObject {
  const text = JSON.stringify(publicKey);
  const known = keys.get(text);
  if (known) return known;
  if (keys.size >= MOST_KEYS) keys.clear();
  const key = createPublicKey({ key: publicKey, format: "jwk" });
  keys.set(text, key);
  return key;
}

function baseFacts(db: Database, event: EventBody): AdmissionFacts["base"] {
  const none = { isQuarantined: false, author: null, slot: null };
  const basis = event.base === null ? null : basisOf(event);
  const base = basis === null ? undefined : genuineEventById(db, basis);
  if (basis === null || !base) return none;
  const isQuarantined = !isPlaced(db, basis);
  return { isQuarantined, author: authorOf(base.body), slot: isQuarantined ? null : slotOfEvent(db, event) };
}

function authorOf(body: string): string | null {
  const { author } = JSON.parse(body) as { author?: unknown };
  return typeof author === "string" ? author : null;
}
