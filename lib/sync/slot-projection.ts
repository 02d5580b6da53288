import { type AgreementLimits, isAgreed } from "./agreement";
import type { EventOf, ReadingValue } from "./event";
import type { SlotState } from "./live";
import type { SlotKind } from "./slot";
import { actsBeneath, basesOf, type SlotEvent, type SlotHeads, slotHeads } from "./slot-heads";

export type ReadingStatus = "accepted" | "superseded" | "void" | "disagrees";

/** One value that was ever given for the slot, and what has become of it. */
export type ProjectedReading = {
  readonly event: string;
  readonly reading: string;
  readonly value: ReadingValue;
  readonly source: "station" | "radio" | "paper";
  readonly status: ReadingStatus;
  readonly author: string;
  readonly device: string;
  readonly capturedAt: string;
  readonly clockOffsetMs: number | null;
  readonly receivedAt: string;
  readonly serverSeq: number;
  readonly reason: string | null;
  /** it stands on an earlier value of the same reading */
  readonly corrects: boolean;
};

export type SlotProjection = {
  readonly state: SlotState;
  readonly readings: readonly ProjectedReading[];
  /** the acts a resolve has to name to settle the slot */
  readonly heads: readonly string[];
  readonly deferred: readonly string[];
};

export type SlotRules = {
  readonly limits: AgreementLimits;
  /** when the test was reconciled, by the server's clock: a reading received after it opens its slot again; null while it is not */
  readonly reconciledAt: string | null;
};

/**
 * What stands in one slot, from all acts that concern it. The same acts give the same answer in any order of arrival and
 * under any duplication.
 *
 * Two corrections of one base, a correction against a void, two resolves of the same heads, a head that a resolve did not
 * name, station readings further apart than the limit, a value or a void after reconciliation: a disagreement. Further readings
 * within the limit stand as replicates. A value by radio or on paper counts only until the station's own is there.
 */
export function slotProjection(kind: SlotKind, events: readonly SlotEvent[], rules: SlotRules): SlotProjection {
  const standing = slotHeads(events);
  const speaking = standing.heads.filter((head) => head.body.type !== "void" || isContradiction(head, standing, rules));
  const isOpen = isDisagreement(kind, standing, speaking, rules);
  const accepted = new Set(isOpen ? [] : speaking.flatMap((head) => chosenValues(head, standing)));
  const readings = [...standing.byId.values()].flatMap((event) => projected(event, standing, accepted, isOpen ? speaking : []));
  return {
    state: slotState(isOpen, speaking, readings),
    readings: withoutRelayed(readings).sort(byEvent),
    // a void that nobody contests is named too: left out, it would stand against the decision
    heads: (isOpen ? standing.heads : speaking).map(({ body }) => body.id),
    deferred: standing.deferred.map(({ body }) => body.id).sort(),
  };
}

function slotState(isOpen: boolean, speaking: readonly SlotEvent[], readings: readonly ProjectedReading[]): SlotState {
  if (isOpen) return "disagrees";
  if (speaking.some(({ body }) => body.type === "resolve")) return "resolved";
  return readings.some(({ status }) => status === "accepted") ? "read" : "empty";
}

function isDisagreement(kind: SlotKind, standing: SlotHeads, speaking: readonly SlotEvent[], rules: SlotRules): boolean {
  if (speaking.some((head) => isContradiction(head, standing, rules))) return true;
  if (speaking.length > 1 && speaking.some(({ body }) => body.type === "resolve")) return true;
  const own = speaking.filter((head) => sourceOf(head) === "station");
  return !isAgreed(kind, (own.length > 0 ? own : speaking).flatMap(valueOfHead), rules.limits);
}

/** A head that contradicts another one, or a result that was agreed before it came. */
function isContradiction(head: SlotEvent, standing: SlotHeads, { reconciledAt }: SlotRules): boolean {
  return standing.forkedHeads.has(head.body.id) || (reconciledAt !== null && isAfter(reconciledAt, head, standing));
}

/** An act, or one that it had to wait for, came after that moment; what a resolve has settled is not asked again. */
function isAfter(moment: string, event: SlotEvent, { byId }: Pick<SlotHeads, "byId">): boolean {
  if (event.body.type === "resolve") return false;
  const bases = basesOf(event).flatMap((id) => byId.get(id) ?? []);
  return event.receivedAt > moment || bases.some((base) => isAfter(moment, base, { byId }));
}

function valueOfHead({ body }: SlotEvent): ReadingValue[] {
  return body.type === "record" || body.type === "correct" ? [body.payload] : [];
}

function sourceOf({ body }: SlotEvent): "station" | "radio" | "paper" {
  return body.source ?? "station";
}

/** The events whose values count when this head stands: its own, or those that a resolve has chosen. */
function chosenValues(head: SlotEvent, standing: SlotHeads): string[] {
  const { body } = head;
  if (body.type === "void") return [];
  if (body.type !== "resolve") return [body.id];
  if (body.payload.choice === "none") return [];
  if (body.payload.choice === "new") return [body.id];
  return chosenActs(head, standing).flatMap((id) => {
    const chosen = standing.byId.get(id);
    return chosen ? chosenValues(chosen, standing) : [];
  });
}

/** Every head for their mean; one of them, or of what they stand on: what an open void would take back can be chosen too. */
function chosenActs(resolve: SlotEvent, { byId }: SlotHeads): readonly string[] {
  const { type, payload } = resolve.body;
  if (type !== "resolve" || payload.choice !== "one") return basesOf(resolve);
  return actsBeneath(resolve, byId).has(payload.head) ? [payload.head] : [];
}

function projected(event: SlotEvent, standing: SlotHeads, accepted: ReadonlySet<string>, open: readonly SlotEvent[]): ProjectedReading[] {
  const value = valueGiven(event);
  if (value === null) return [];
  const { body, serverSeq, receivedAt } = event;
  const { id, author, device, capturedAt, clockOffsetMs, reason } = body;
  const disagrees = open.some((head) => contested(head, standing).includes(id));
  const status = accepted.has(id) ? "accepted" : disagrees ? "disagrees" : isVoided(id, standing) ? "void" : "superseded";
  const provenance = { author, device, capturedAt, clockOffsetMs, receivedAt, serverSeq, reason };
  return [
    { event: id, reading: body.reading ?? id, value, source: sourceOf(event), status, corrects: body.type === "correct", ...provenance },
  ];
}

function valueGiven({ body }: SlotEvent): ReadingValue | null {
  if (body.type === "record" || body.type === "correct") return body.payload;
  return isNewValue(body) ? body.payload.value : null;
}

function isNewValue(body: SlotEvent["body"]): body is EventOf<"resolve"> & { payload: { choice: "new"; value: ReadingValue } } {
  return body.type === "resolve" && body.payload.choice === "new";
}

/** The values an open head brings into the disagreement: its own, those it chose, or the one it would make void. */
function contested(head: SlotEvent, standing: SlotHeads): readonly string[] {
  return head.body.type === "void" ? basesOf(head) : chosenValues(head, standing);
}

function isVoided(id: string, standing: SlotHeads): boolean {
  return [...standing.byId.values()].some((event) => event.body.type === "void" && basesOf(event).includes(id));
}

/** A relayed value steps back once the station's own reading counts; a resolve's choice is nobody's relay. */
function withoutRelayed(readings: readonly ProjectedReading[]): ProjectedReading[] {
  const hasOwn = readings.some(({ status, source }) => status === "accepted" && source === "station");
  if (!hasOwn) return [...readings];
  return readings.map((reading) =>
    reading.status === "accepted" && reading.source !== "station" ? { ...reading, status: "superseded" } : reading,
  );
}

function byEvent(a: ProjectedReading, b: ProjectedReading): number {
  return a.event < b.event ? -1 : 1;
}
