"use client";

import { useRouter } from "next/navigation";
import { useState } from "react";
import { z } from "zod";
import type { NewPerson } from "@/lib/people/new-person";

const invitedSchema = z.object({
  account: z.string().optional(),
  link: z.string(),
  expiresAt: z.string(),
  mail: z.enum(["sent", "kept", "refused"]),
});
const refusedSchema = z.object({ error: z.string() });
export type Invitation = z.infer<typeof invitedSchema>;
type Refused = { readonly refused: string };

/** What an administrator does to accounts; after each the page shows what stands then. */
export function usePeople() {
  const router = useRouter();
  const [busy, setBusy] = useState(false);
  const [refused, setRefused] = useState<string | null>(null);

  const told = async (address: string, method: string, body?: unknown): Promise<unknown> => {
    setBusy(true);
    const answer = await asked(address, method, body);
    setBusy(false);
    setRefused(isRefused(answer) ? answer.refused : null);
    if (!isRefused(answer)) router.refresh();
    return isRefused(answer) ? null : answer;
  };
  const invited = async (address: string, body?: unknown) =>
    invitedSchema
      .nullable()
      .catch(null)
      .parse(await told(address, "POST", body));

  return {
    busy,
    refused,
    invite: (person: NewPerson) => invited("/api/v1/people", person),
    inviteAgain: (person: string) => invited(`/api/v1/people/${person}/link`),
    setStanding: (person: string, to: { isAdministrator: boolean; isEngineer: boolean; isClosed: boolean }) =>
      told(`/api/v1/people/${person}`, "PUT", to),
    setRole: (test: string, given: { account: string; role: string; isHeld: boolean }) => told(`/api/v1/tests/${test}/roles`, "PUT", given),
    stopPhone: (test: string, device: string) => told(`/api/v1/tests/${test}/devices/${device}`, "DELETE"),
  };
}

async function asked(address: string, method: string, body: unknown): Promise<unknown | Refused> {
  try {
    const response = await fetch(address, {
      method,
      headers: { "content-type": "application/json" },
      ...(body === undefined ? {} : { body: JSON.stringify(body) }),
    });
    const said: unknown = response.status === 204 ? {} : await response.json().catch(() => ({}));
    if (response.ok) return said;
    const refusal = refusedSchema.safeParse(said);
    return { refused: refusal.success ? refusal.data.error : "The server refused, and did not say why." };
  } catch {
    return { refused: "The server does not answer; nothing was changed." };
  }
}

function isRefused(answer: unknown): answer is Refused {
  return typeof answer === "object" && answer !== null && "refused" in answer;
}
