"use client";

import { useLiveQuery } from "dexie-react-hooks";
import { useCallback, useMemo, useState } from "react";
import { v7 as newReadingId } from "uuid";
import { appendEvent, type EventDraft } from "@/db/device/append-event";
import { deviceDatabase } from "@/db/device/device-database";
import { bodyOf } from "@/db/device/own-readings";
import type { EventBody, ReadingValue } from "@/lib/sync/event";
import type { StandingReading } from "@/lib/sync/live";
import { isUnsent } from "@/lib/sync/outbox";
import type { Slot } from "@/lib/sync/slot";
import { announceSaved } from "@/worker/sync-client";
import type { Choice, LeadActs, MoveRun } from "./lead-acts";

type Lead = { readonly test: string; readonly person: string; readonly jobTag: string };

/** The lead's acts, each an event of this device: on its disk first, then on the way to the server like every phone's. */
export function useLeadActs({ test, person, jobTag }: Lead) {
  const [failed, setFailed] = useState<string | null>(null);
  const unsent = useLiveQuery(() => unsentOf(test), [test]);
  const append = useCallback(async (draft: EventDraft) => {
    try {
      await appendEvent(draft);
      setFailed(null);
      announceSaved();
    } catch {
      setFailed("This device could not save the order. Nothing was sent: try once more, or write it down.");
    }
  }, []);
  const acts = useMemo(() => leadActs({ test, person, jobTag }, append), [test, person, jobTag, append]);
  return { acts, unsent: unsent ?? [], failed };
}

async function unsentOf(test: string): Promise<EventBody[]> {
  const held = await deviceDatabase().events.where("test").equals(test).toArray();
  return held
    .filter(isUnsent)
    .sort((one, other) => one.seq - other.seq)
    .map(bodyOf);
}

function leadActs(lead: Lead, append: (draft: EventDraft) => Promise<void>): LeadActs {
  const act = (reason: string | null) => ({
    test: lead.test,
    author: lead.person,
    jobTag: lead.jobTag,
    capturedAt: new Date().toISOString(),
    reason,
  });
  const noReading = { reading: null, base: null, slot: null, source: null } as const;
  const run = ({ no, repeat }: MoveRun) => ({ move: no, repeat });
  return {
    openMove: (move) => append({ ...act(null), ...noReading, type: "move.open", payload: run(move) }),
    closeMove: (move) => append({ ...act(null), ...noReading, type: "move.close", payload: run(move) }),
    repeatMove: (move) => append({ ...act(null), ...noReading, type: "move.repeat", payload: run(move) }),
    excludeMove: (move, reason) => append({ ...act(reason), ...noReading, type: "move.exclude", payload: run(move) }),
    release: (event, reason) => append({ ...act(reason), ...noReading, type: "release", payload: { event } }),
    assign: (event, slot, reason) => append({ ...act(reason), ...noReading, type: "assign", slot, payload: { event } }),
    writeOff: (device, reason) => append({ ...act(reason), ...noReading, type: "device.writeOff", payload: { device } }),
    takeBack: ({ reading, event }, slot, reason) =>
      append({ ...act(reason), type: "void", reading, base: event, slot, payload: {}, source: null }),
    record: (slot, payload, source) => append({ ...act(null), type: "record", reading: newReadingId(), base: null, slot, payload, source }),
    correct: ({ reading, event, source }: StandingReading, slot: Slot, payload: ReadingValue, reason: string) =>
      append({ ...act(reason), type: "correct", reading, base: event, slot, payload, source }),
    resolve: (heads: readonly string[], slot: Slot, choice: Choice, reason: string) =>
      append({ ...act(reason), type: "resolve", reading: null, base: [...heads], slot, payload: choice, source: null }),
  };
}
