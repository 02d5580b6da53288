"use client";

import { useSyncExternalStore } from "react";

const day = { day: "numeric", month: "long" } as const;
const options = { hour: "2-digit", minute: "2-digit", second: "2-digit", hourCycle: "h23" } as const;

/** A moment by the clock of whoever looks; the server, which does not know that clock, writes UTC. */
export function TimeOfDay({ at, dated = false }: { at: string; dated?: boolean }) {
  const words = useTimeOfDay(at, dated);
  return (
    <time dateTime={at} className="whitespace-nowrap tabular-nums">
      {words}
    </time>
  );
}

/** The same as text, for what is read out and not seen. */
export function useTimeOfDay(at: string, dated = false): string {
  const zone = useSyncExternalStore(
    neverChanges,
    () => Intl.DateTimeFormat().resolvedOptions().timeZone,
    () => "UTC",
  );
  return new Intl.DateTimeFormat("en-GB", { ...options, ...(dated ? day : {}), timeZone: zone }).format(new Date(at));
}

function neverChanges() {
  return () => {};
}
