"use client";

import type { ReactNode } from "react";
import { LightSwitch } from "@/components/ui/light-switch";
import { HomeLink } from "./home-link";
import { NewVersion } from "./new-version";
import { QueueLine } from "./queue-line";
import { StorageLoss } from "./storage-loss";
import { useSending } from "./use-sending";
import { useWakeLock } from "./use-wake-lock";

/** What stands around every page for readings: the way back, the state of the queue, the light. */
export function ReadingsShell({ children }: { children: ReactNode }) {
  useSending();
  useWakeLock();
  return (
    <div className="mx-auto flex min-h-dvh max-w-hand flex-col">
      <header className="flex items-center gap-2 border-ink-line border-b bg-sailcloth-raised px-2 py-1">
        <HomeLink />
        <QueueLine />
        <LightSwitch compact />
      </header>
      <NewVersion />
      <StorageLoss />
      <main id="main" className="flex flex-1 flex-col px-3 pt-2 pb-[max(0.75rem,env(safe-area-inset-bottom))]">
        {children}
      </main>
    </div>
  );
}
