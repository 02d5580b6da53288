import { answer, type Result, refuse } from "@/lib/result";
import { type EventBody, eventBodySchema, type ReadingEvent, type ReadingValue, valueSchemas } from "./event";
import type { Role } from "./job-sheet";
import type { QuarantineCode } from "./protocol";
import { type DuePlan, isInPlan, type Ordered } from "./readings-due";
import type { Slot } from "./slot";

export type Quarantine = { readonly type: QuarantineCode; readonly message: string };

/** What the server knows of the sender and of what stands already, when an event arrives. */
export type AdmissionFacts = {
  readonly device: { readonly isKnown: boolean; readonly isRevoked: boolean; readonly hasKey: boolean };
  /** null: the envelope carries none */
  readonly isSignatureGood: boolean | null;
  readonly isIdTakenByOtherBytes: boolean;
  readonly isSeqTaken: boolean;
  /** the author is one of those who ever held the phone */
  readonly isAuthorHolder: boolean;
  /** who sends it held the phone, or has the wheelhouse: what is not signed is believed of nobody else */
  readonly isSenderTrusted: boolean;
  readonly rolesHeld: readonly Role[];
  /** null: the test is not on this server */
  readonly plan: { readonly plan: DuePlan; readonly ordered: Ordered } | null;
  /** the act it stands on; its slot is where both belong, whatever the later one says */
  readonly base: { readonly isQuarantined: boolean; readonly author: string | null; readonly slot: Slot | null };
};

/** An event's body out of its text, or why it can't be read. The text itself is kept either way. */
export function eventFromText(text: string): Result<EventBody, Quarantine> {
  const json = parsedJson(text);
  if (json === undefined) return refuse(quarantine("malformed-body", "The event is not JSON"));
  const parsed = eventBodySchema.safeParse(json);
  if (parsed.success) return answer(parsed.data);
  const issue = parsed.error.issues[0];
  return refuse(quarantine("malformed-body", `${issue?.path.join(".") || "body"}: ${issue?.message ?? "not an event"}`));
}

/**
 * Whether an event takes part, or is set aside with a code and a sentence. What is set aside is stored all the same and
 * never blocks another event.
 */
export function admission(event: EventBody, facts: AdmissionFacts): Result<EventBody, Quarantine> {
  const refusal = senderRefusal(event, facts) ?? roleRefusal(event, facts) ?? placeRefusal(event, facts);
  return refusal ? refuse(refusal) : answer(event);
}

function senderRefusal(
  event: EventBody,
  { device, isSignatureGood, isIdTakenByOtherBytes, isSeqTaken, isAuthorHolder, isSenderTrusted, plan }: AdmissionFacts,
): Quarantine | null {
  if (!device.isKnown) return quarantine("unknown-device", "This phone is not enrolled on this server");
  if (device.isRevoked) return quarantine("revoked-device", "This phone was revoked");
  if (isSignatureGood === false) return quarantine("bad-signature", "The signature does not fit the event's bytes");
  if (isSignatureGood === null && device.hasKey) return quarantine("bad-signature", "This phone has a key, but the event is not signed");
  if (isSignatureGood === null && !isSenderTrusted) return quarantine("bad-signature", "It is not signed, and somebody else sent it");
  if (!isAuthorHolder) return quarantine("role-not-held", "The author never held this phone");
  if (isIdTakenByOtherBytes) return quarantine("same-id-other-bytes", "Another event has this id");
  if (isSeqTaken) return quarantine("forked-device", `Number ${event.seq} of this phone is another event: enrol the phone again`);
  return plan ? null : quarantine("unknown-test", "The test is not on this server");
}

/** Who may act on anybody's reading. */
export const wheelhouse: readonly Role[] = ["lead", "engineer"];

function roleRefusal(event: EventBody, { rolesHeld, base }: AdmissionFacts): Quarantine | null {
  if (isAllowed(event, rolesHeld, base.author)) return null;
  const held = rolesHeld.length > 0 ? rolesHeld.join(", ") : "none in this test";
  return quarantine("role-not-held", `${event.type} needs another role than the author held then (${held})`);
}

function isAllowed(event: EventBody, held: readonly Role[], baseAuthor: string | null): boolean {
  if (event.type === "attest") return held.includes("witness");
  if (held.some((role) => wheelhouse.includes(role))) return true;
  if (!held.includes("reader")) return false;
  if (event.type === "record") return event.source === "station";
  // a base that has not arrived yet is judged when it does: it is the same person's, or it will be set aside
  return isOnReading(event) && (baseAuthor === null || baseAuthor === event.author);
}

function placeRefusal(event: EventBody, { plan, base }: AdmissionFacts): Quarantine | null {
  if (base.isQuarantined) return quarantine("base-quarantined", "The reading it stands on is set aside");
  const slot = base.slot ?? event.slot;
  if (slot === null || plan === null) return null;
  if (!isInPlan(plan.plan, plan.ordered, slot)) return quarantine("unknown-slot", "The plan has no such reading due");
  return isFitting(event, slot, plan.plan)
    ? null
    : quarantine("value-does-not-fit-slot", "The value is of another kind than the reading due");
}

/** Whether an act may stand in a slot: one that gives a value gives one of the slot's kind. */
export function isFitting(event: EventBody, slot: Slot, plan: DuePlan): boolean {
  if (event.type === "resolve" && event.payload.choice === "new") return isValueOfSlot({ payload: event.payload.value }, slot, plan);
  return event.type === "record" || event.type === "correct" ? isValueOfSlot(event, slot, plan) : true;
}

/** The kind that a reading due asks for, down to the instrument of its station. */
function isValueOfSlot({ payload }: { readonly payload: ReadingValue }, slot: Slot, plan: DuePlan): boolean {
  if (!valueSchemas[slot.kind].safeParse(payload).success) return false;
  if (slot.kind !== "batten") return true;
  const instrument = plan.stations.find(({ id }) => id === slot.station)?.instrument;
  const shape = { pendulum: "valuesMm", "u-tube": "portMm", inclinometer: "valuesDegrees" } as const;
  return instrument !== undefined && shape[instrument] in payload;
}

function isOnReading(event: EventBody): event is ReadingEvent {
  return event.type === "correct" || event.type === "void";
}

function quarantine(type: QuarantineCode, message: string): Quarantine {
  return { type, message };
}

function parsedJson(text: string): unknown {
  try {
    return JSON.parse(text);
  } catch {
    return undefined;
  }
}
