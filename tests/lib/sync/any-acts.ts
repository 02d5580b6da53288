import fc from "fast-check";
import type { EventOf } from "@/lib/sync/event";
import { correct, one, received, record, resolve, settled, takenBack } from "./sample-acts";

export type Act = EventOf<"record" | "correct" | "void" | "resolve">;

/** An act on up to three others of its set: earlier ones, later ones, itself, or some that are missing. */
const anyAct = fc.record({
  type: fc.constantFrom("record" as const, "record" as const, "correct" as const, "void" as const, "resolve" as const),
  bases: fc.array(fc.integer({ min: 1, max: 10 }), { minLength: 1, maxLength: 3 }),
  mm: fc.constantFrom(100, 101, 102.5, 110),
  source: fc.constantFrom("station" as const, "station" as const, "radio" as const, "paper" as const),
  choice: fc.constantFrom("one" as const, "mean" as const, "new" as const, "none" as const),
  head: fc.integer({ min: 1, max: 10 }),
});

/** Acts in one slot, numbered from 1. */
export const anyActs = fc.array(anyAct, { maxLength: 9 }).map((drawn): Act[] =>
  drawn.map(({ type, bases, mm, source, choice, head }, i) => {
    const [base = 1] = bases;
    if (type === "record") return record(i + 1, settled(mm), { source });
    if (type === "correct") return correct(i + 1, base, settled(mm), { source });
    if (type === "void") return takenBack(i + 1, base);
    return resolve(i + 1, bases, choice === "one" ? one(head) : choice === "new" ? { choice, value: settled(mm) } : { choice });
  }),
);

/** The same acts once in order, and once in any order with any of them repeated. */
export const anyArrivals = anyActs.chain((acts) =>
  fc.record({
    acts: fc.constant(acts),
    arrived: fc.subarray(acts).chain((again) => fc.shuffledSubarray([...acts, ...again], { minLength: acts.length + again.length })),
  }),
);

/** When the test was reconciled, in the middle of all that; null: not yet. */
export const anyMoment = fc.option(fc.integer({ min: 0, max: 9 }).map(received));
