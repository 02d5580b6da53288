"use client";

import { useState } from "react";
import useSWR from "swr";
import { z } from "zod";
import { type BackupNews, backupNewsSchema } from "@/lib/report/backup-words";

const EVERY_MS = 60_000;
const address = "/api/v1/backups";
const refusedSchema = z.object({ error: z.string() });

/** How it stands with the backups, asked again every minute, and the order to make one. */
export function useBackups(first: BackupNews) {
  const { data, mutate } = useSWR(address, asked, { fallbackData: first, refreshInterval: EVERY_MS, revalidateOnMount: false });
  const [busy, setBusy] = useState(false);
  const [refused, setRefused] = useState<string | null>(null);
  const backUp = async () => {
    setBusy(true);
    const made = await ordered();
    setBusy(false);
    setRefused("refused" in made ? made.refused : null);
    await ("refused" in made ? mutate() : mutate(made, { revalidate: false }));
  };
  return { news: data ?? first, backUp, busy, refused };
}

async function asked(): Promise<BackupNews> {
  return backupNewsSchema.parse(await (await fetch(address)).json());
}

async function ordered(): Promise<BackupNews | { readonly refused: string }> {
  const answer = await fetch(address, { method: "POST" }).catch(() => null);
  if (answer === null) return { refused: "The server does not answer; no backup was made." };
  const said: unknown = await answer.json().catch(() => null);
  const made = backupNewsSchema.safeParse(said);
  if (made.success) return made.data;
  const refusal = refusedSchema.safeParse(said);
  return { refused: refusal.success ? refusal.data.error : "The server made no backup, and did not say why." };
}
