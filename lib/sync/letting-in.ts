import { isFitting, type Quarantine } from "./admission";
import type { EventBody, EventOf } from "./event";
import type { QuarantineCode } from "./protocol";
import { type DuePlan, isInPlan, type Ordered } from "./readings-due";

/** An event that was set aside, as the act finds it that wants to let it in. */
export type SetAside = {
  /** null: its text can't be read as an event */
  readonly body: EventBody | null;
  /** null: it was not set aside */
  readonly code: QuarantineCode | null;
  /** it takes part already, or another event of its id does */
  readonly isPlaced: boolean;
};

/** What nobody can let in: there is no event in it, or another one has its name. */
const lost: readonly QuarantineCode[] = ["malformed-body", "same-id-other-bytes", "unknown-test"];

/**
 * Why an act of the wheelhouse can't let an event in: `release` gives it the place it asked for itself, `assign` another
 * one. Null where it can.
 */
export function lettingInRefusal(
  act: EventOf<"assign" | "release">,
  { body, code, isPlaced }: SetAside,
  { plan, ordered }: { readonly plan: DuePlan; readonly ordered: Ordered },
): Quarantine | null {
  if (isPlaced || code === null) return { type: "not-set-aside", message: "The event it lets in was not set aside, or takes part already" };
  if (body === null || lost.includes(code)) return { type: "not-set-aside", message: "The event it lets in can't take part in any way" };
  const slot = act.slot ?? body.slot;
  if (slot === null) return null;
  if (!isInPlan(plan, ordered, slot)) return { type: "unknown-slot", message: "The plan has no such reading due: give it another place" };
  if (isFitting(body, slot, plan)) return null;
  return { type: "value-does-not-fit-slot", message: "The value is of another kind than the reading due there" };
}
