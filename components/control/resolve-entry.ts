import { z } from "zod";
import type { TestRecord } from "@/lib/record/test-record";
import type { ReadingDue, StandingReading } from "@/lib/sync/live";
import type { Choice } from "./lead-acts";
import { radioEmpty, radioSchema } from "./radio-entry";

export type ResolveTyped = { choice: string; value: string; port: string; starboard: string; reason: string };
export type Resolved = { readonly choice: Choice; readonly reason: string };

export const resolveEmpty: ResolveTyped = { choice: "", value: "", port: "", starboard: "", reason: "" };

/** Settling takes a choice and a reason: one of the readings (by its event), their mean, a new value, or none. */
export function resolveSchema(due: ReadingDue, heads: readonly StandingReading[], stations: TestRecord["stations"]) {
  const typed = z.object({ choice: z.string(), value: z.string(), port: z.string(), starboard: z.string(), reason: z.string() });
  return typed.transform((entry, context): Resolved => {
    if (entry.reason.trim() === "") {
      context.addIssue({ code: "custom", path: ["reason"], message: "Write the reason: it stands in the ledger beside your name." });
    }
    const choice = choiceOf(entry, due, heads, stations, context);
    return choice && context.issues.length === 0 ? { choice, reason: entry.reason.trim() } : z.NEVER;
  });
}

function choiceOf(
  entry: ResolveTyped,
  due: ReadingDue,
  heads: readonly StandingReading[],
  stations: TestRecord["stations"],
  context: z.RefinementCtx,
): Choice | null {
  if (entry.choice === "mean" || entry.choice === "none") return { choice: entry.choice };
  if (entry.choice === "new") return newValue(entry, due, stations, context);
  const head = heads.find((each) => each.event === entry.choice);
  if (head) return { choice: "one", head: head.event };
  context.addIssue({ code: "custom", path: ["choice"], message: "Choose what is to stand." });
  return null;
}

function newValue(entry: ResolveTyped, due: ReadingDue, stations: TestRecord["stations"], context: z.RefinementCtx): Choice | null {
  const { value, port, starboard } = entry;
  const read = radioSchema([due], stations).safeParse({ ...radioEmpty, slotKey: due.slotKey, value, port, starboard });
  if (read.success) return { choice: "new", value: read.data.value };
  for (const { path, message } of read.error.issues) context.addIssue({ code: "custom", path: [...path], message });
  return null;
}
