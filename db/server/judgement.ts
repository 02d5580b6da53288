import { admission, eventFromText, type Quarantine } from "@/lib/sync/admission";
import { isLettingIn } from "@/lib/sync/basis";
import type { EventBody, EventOf } from "@/lib/sync/event";
import { lettingInRefusal } from "@/lib/sync/letting-in";
import type { Envelope, Outcome, QuarantineCode } from "@/lib/sync/protocol";
import { admissionFacts } from "./admission-facts";
import type { Database } from "./connection";
import { duePlan } from "./due-plan";
import { eventById } from "./event-store";
import { isPlaced, placeEvent, slotOfEvent } from "./slot-standing";

/** What becomes of an event: it takes part, waits, disagrees, or is set aside with a code and a sentence. */
export type Judgement = { readonly outcome: Outcome; readonly code: QuarantineCode | null; readonly message: string | null };

type Stamp = { readonly serverSeq: number; readonly at: string; readonly account: string; readonly bodyHash: string };

/** Decides on an event that has not been seen before, and places it where it takes part. */
export function judged(db: Database, body: EventBody, envelope: Envelope, stamp: Stamp): Judgement {
  const admitted = admission(body, admissionFacts(db, body, { envelope, bodyHash: stamp.bodyHash }, stamp));
  if (!admitted.ok) return setAside(admitted.refusal);
  if (isLettingIn(body)) return judgedLettingIn(db, body, stamp);
  return placed(db, body, stamp);
}

export function setAside({ type, message }: Quarantine): Judgement {
  return { outcome: "quarantined", code: type, message };
}

function placed(db: Database, body: EventBody, { serverSeq, at }: Stamp): Judgement {
  const standing = placeEvent(db, { body, serverSeq, receivedAt: at }, slotOfEvent(db, body));
  if (standing === null) return takesPart(body.type === "resolve" ? "deferred" : "applied");
  if (standing.deferred.includes(body.id)) return takesPart("deferred");
  return takesPart(standing.state === "disagrees" ? "disagrees" : "applied");
}

function judgedLettingIn(db: Database, act: EventOf<"assign" | "release">, stamp: Stamp): Judgement {
  const target = eventById(db, act.payload.event);
  const plan = duePlan(db, act.test);
  if (target && target.test !== act.test) return setAside({ type: "not-set-aside", message: "The event it lets in is of another test" });
  if (target && plan) {
    const read = eventFromText(target.body);
    const facts = { body: read.ok ? read.value : null, code: target.code ?? "role-not-held", isPlaced: isPlaced(db, act.payload.event) };
    const refusal = lettingInRefusal(act, facts, plan);
    if (refusal) return setAside(refusal);
  }
  placed(db, act, stamp);
  return takesPart(target ? "applied" : "deferred");
}

function takesPart(outcome: Outcome): Judgement {
  return { outcome, code: null, message: null };
}
