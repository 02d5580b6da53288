"use client";

import { useSyncExternalStore } from "react";

const options = { hour: "2-digit", minute: "2-digit", second: "2-digit", hourCycle: "h23" } as const;

/** A moment by the clock of whoever looks; the server, which does not know that clock, writes UTC. */
export function TimeOfDay({ at }: { at: string }) {
  const zone = useSyncExternalStore(
    neverChanges,
    () => Intl.DateTimeFormat().resolvedOptions().timeZone,
    () => "UTC",
  );
  return (
    <time dateTime={at} className="whitespace-nowrap font-mono">
      {new Intl.DateTimeFormat("en-GB", { ...options, timeZone: zone }).format(new Date(at))}
    </time>
  );
}

function neverChanges() {
  return () => {};
}
