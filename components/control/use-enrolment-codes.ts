"use client";

import { z } from "zod";
import type { MadeCode } from "./enrolment";

export type NewCode = { readonly personName: string; readonly role: "reader" | "lead" | "engineer" | "witness" };
export type MakeCode = (given: NewCode) => Promise<MadeCode | { readonly refused: string }>;

const madeSchema = z.object({ code: z.string(), expiresAt: z.string(), url: z.url() });
const refusedSchema = z.object({ error: z.string() });

/** Makes codes that let phones into a test. */
export function useEnrolmentCodes(test: string): MakeCode {
  return async (given) => {
    try {
      const response = await fetch(`/api/v1/tests/${test}/enrolments`, {
        method: "POST",
        headers: { "content-type": "application/json" },
        body: JSON.stringify(given),
      });
      return madeFrom(await response.json(), given.personName);
    } catch {
      return { refused: "The server does not answer; a code needs it. Try again when it is back." };
    }
  };
}

function madeFrom(answer: unknown, personName: string): MadeCode | { refused: string } {
  const made = madeSchema.safeParse(answer);
  if (made.success) return { ...made.data, personName };
  const refused = refusedSchema.safeParse(answer);
  return { refused: refused.success ? refused.data.error : "The server made no code, and did not say why." };
}
