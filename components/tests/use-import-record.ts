"use client";

import { z } from "zod";
import { testRecordSchema } from "@/lib/record/test-record";

export type Imported = { readonly test: string } | { readonly faults: readonly string[] };

const takenInSchema = z.object({ test: z.uuid() });
const refusedSchema = z.object({ faults: z.array(z.string()).min(1) });
const MOST_FAULTS = 12;

/** Takes a record file to the server, after reading it here: a bad file is refused before it travels. */
export function useImportRecord() {
  return async (file: File): Promise<Imported> => {
    const text = await file.text();
    const faults = faultsIn(text);
    if (faults.length > 0) return { faults };
    try {
      const answer = await fetch("/api/v1/records", { method: "POST", headers: { "content-type": "application/json" }, body: text });
      return imported(answer.ok, await answer.json());
    } catch {
      return { faults: ["The server does not answer; nothing was taken in."] };
    }
  };
}

function imported(taken: boolean, answer: unknown): Imported {
  const test = takenInSchema.safeParse(answer);
  if (taken && test.success) return test.data;
  const refused = refusedSchema.safeParse(answer);
  return refused.success ? refused.data : { faults: ["The server refused the file without saying why."] };
}

function faultsIn(text: string): string[] {
  const read = parsed(text);
  if (read === undefined) return ["This is no JSON document."];
  const record = testRecordSchema.safeParse(read);
  if (record.success) return [];
  return record.error.issues.slice(0, MOST_FAULTS).map((issue) => `${issue.path.join(".") || "document"}: ${issue.message}`);
}

function parsed(text: string): unknown {
  try {
    return JSON.parse(text);
  } catch {
    return undefined;
  }
}
