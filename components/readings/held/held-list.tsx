"use client";

import { Sign, type SignKind } from "@/components/ui/sign";
import { TimeOfDay } from "@/components/ui/time-of-day";
import type { EventState } from "@/lib/sync/outbox";
import { actWords, stateWords, valueWords } from "./event-words";
import type { Held } from "./use-held-events";

const signs: Record<EventState, SignKind> = {
  saved: "due",
  sending: "waiting",
  "on-server": "read",
  confirmed: "settled",
  quarantined: "alert",
};

/** Every event with its number, its value and where it stands. */
export function HeldList({ held }: { held: readonly Held[] }) {
  return (
    <ol className="flex flex-col gap-1.5" aria-label="Events on this phone, the newest first">
      {held.map(({ event, body }) => (
        <li key={event.id} className="grid grid-cols-[2.25rem_1fr] gap-x-2 rounded border border-ink-line bg-sailcloth-raised px-3 py-2">
          <span className="font-mono text-ink-soft text-small">{event.seq}</span>
          <div className="min-w-0">
            <p className="flex items-baseline justify-between gap-2">
              <span className="font-bold">{actWords(body)}</span>
              <span className="shrink-0 text-ink-soft text-small">
                <TimeOfDay at={body.capturedAt} />
              </span>
            </p>
            <p className="break-words text-large">{valueWords(body)}</p>
            <p className={`flex items-center gap-2 text-small ${event.state === "quarantined" ? "text-redlead-text" : "text-ink-soft"}`}>
              <Sign kind={signs[event.state]} />
              {stateWords(event.state, event.receipt)}
              {event.envelope.signature === null ? " · unsigned" : ""}
            </p>
          </div>
        </li>
      ))}
    </ol>
  );
}
