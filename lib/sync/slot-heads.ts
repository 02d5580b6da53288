import type { EventOf } from "./event";

/** An event that the server (or the wheelhouse's own device) has let in, with its number there. */
export type Stamped<E> = { readonly body: E; readonly serverSeq: number; readonly receivedAt: string };

export type SlotEvent = Stamped<EventOf<"record" | "correct" | "void" | "resolve">>;

/**
 * The acts of one slot as they stand on each other: a correction or a void stands on one act, a resolve on every act it
 * settles. `heads` are those that nothing stands on; `forkedHeads` are heads reached from one act by ways that part, of
 * which not all are voids; `deferred` wait for an act that has not arrived. The order of arrival plays no part.
 */
export type SlotHeads = {
  readonly heads: readonly SlotEvent[];
  readonly forkedHeads: ReadonlySet<string>;
  readonly deferred: readonly SlotEvent[];
  readonly byId: ReadonlyMap<string, SlotEvent>;
};

/** How the acts of one slot stand on each other. */
export function slotHeads(events: readonly SlotEvent[]): SlotHeads {
  const known = new Map(events.map((event) => [event.body.id, event]));
  const deferred = [...known.values()].filter((event) => !isRooted(event, known, new Set()));
  const waiting = new Set(deferred.map(({ body }) => body.id));
  const byId = new Map([...known].filter(([id]) => !waiting.has(id)));
  const above = childrenOf(byId);
  const heads = [...byId.values()].filter(({ body }) => !above.has(body.id)).sort(inOrderOfIds);
  return { heads, forkedHeads: forkedHeads(above, heads), deferred, byId };
}

/** Every act that an act stands on, down to the first ones. */
export function actsBeneath(event: SlotEvent, byId: ReadonlyMap<string, SlotEvent>): ReadonlySet<string> {
  const found = new Set<string>();
  const toVisit = [...basesOf(event)];
  for (const id of toVisit) {
    const base = found.has(id) ? undefined : byId.get(id);
    found.add(id);
    if (base) toVisit.push(...basesOf(base));
  }
  return found;
}

/** The acts that an act stands on. */
export function basesOf({ body }: SlotEvent): readonly string[] {
  if (body.base === null) return [];
  return typeof body.base === "string" ? [body.base] : body.base;
}

function isRooted(event: SlotEvent, known: ReadonlyMap<string, SlotEvent>, seen: Set<string>): boolean {
  if (seen.has(event.body.id)) return false;
  const further = new Set(seen).add(event.body.id);
  return basesOf(event).every((id) => {
    const base = known.get(id);
    return base !== undefined && isRooted(base, known, further);
  });
}

function childrenOf(byId: ReadonlyMap<string, SlotEvent>): Map<string, string[]> {
  const above = new Map<string, string[]>();
  for (const event of byId.values()) {
    for (const base of basesOf(event)) above.set(base, [...(above.get(base) ?? []), event.body.id]);
  }
  return above;
}

/** Heads that contradict a head of the same base: two corrections, two resolves, a correction and a void. Two voids say the same. */
function forkedHeads(above: ReadonlyMap<string, string[]>, heads: readonly SlotEvent[]): Set<string> {
  const isHead = new Set(heads.map(({ body }) => body.id));
  const isVoid = new Set(heads.flatMap(({ body }) => (body.type === "void" ? [body.id] : [])));
  const forked = new Set<string>();
  for (const children of above.values()) {
    const reached = children.map((child) => headsAbove(child, above, isHead));
    const all = new Set(reached.flat());
    if (all.size > 1 && ![...all].every((head) => isVoid.has(head))) for (const head of all) forked.add(head);
  }
  return forked;
}

function headsAbove(id: string, above: ReadonlyMap<string, string[]>, isHead: ReadonlySet<string>): string[] {
  if (isHead.has(id)) return [id];
  return (above.get(id) ?? []).flatMap((child) => headsAbove(child, above, isHead));
}

function inOrderOfIds(a: SlotEvent, b: SlotEvent): number {
  return a.body.id < b.body.id ? -1 : 1;
}
