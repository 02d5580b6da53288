import { useState } from "react";
import { z } from "zod";
import type { TestState } from "@/lib/sync/job-sheet";

const refusedSchema = z.object({ error: z.string() });

/** Asks the server to take the test to another state; the live line then shows it. */
export function useTestState(test: string) {
  const [refused, setRefused] = useState<string | null>(null);
  const [busy, setBusy] = useState(false);
  const take = async (to: TestState, reason: string | null) => {
    setBusy(true);
    const answer = await fetch(`/api/v1/tests/${test}/state`, {
      method: "POST",
      headers: { "content-type": "application/json" },
      body: JSON.stringify({ to, reason }),
    }).catch(() => null);
    setBusy(false);
    if (answer === null) return setRefused("The server does not answer; the test stays as it is.");
    const said = refusedSchema.safeParse(await answer.json().catch(() => null));
    setRefused(answer.ok ? null : said.success ? said.data.error : "The server refused it without saying why.");
  };
  return { take, refused, busy };
}
