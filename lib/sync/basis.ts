import type { EventBody, EventOf } from "./event";

/** The act that an act stands on, or the one that it lets in; of several that a resolve settles the first. Null: it stands alone. */
export function basisOf(body: EventBody): string | null {
  if (isLettingIn(body)) return body.payload.event;
  return typeof body.base === "string" ? body.base : (body.base?.[0] ?? null);
}

/** An act of the wheelhouse that lets in what was set aside. */
export function isLettingIn(body: EventBody): body is EventOf<"assign" | "release"> {
  return body.type === "assign" || body.type === "release";
}
