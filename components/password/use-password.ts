"use client";

import { z } from "zod";

const refusedSchema = z.object({ error: z.string() });

/** Sets the password that a link is for; null when it is set, else why not. */
export function setPassword(token: string, password: string): Promise<string | null> {
  return posted("/api/v1/password", { token, password });
}

/** Asks for a link by mail; null when the server has heard. */
export function askForLink(email: string): Promise<string | null> {
  return posted("/api/v1/password/forgotten", { email });
}

async function posted(address: string, body: unknown): Promise<string | null> {
  try {
    const response = await fetch(address, { method: "POST", headers: { "content-type": "application/json" }, body: JSON.stringify(body) });
    if (response.ok) return null;
    const refusal = refusedSchema.safeParse(await response.json().catch(() => null));
    return refusal.success ? refusal.data.error : "The server refused, and did not say why.";
  } catch {
    return "The server does not answer. Check that this device is on the ship's or the office's network.";
  }
}
