import { useState } from "react";
import { v7 as newReadingId } from "uuid";
import type { EventDraft } from "@/db/device/append-event";
import type { ReadingValue } from "@/lib/sync/event";
import type { JobSheet } from "@/lib/sync/job-sheet";
import type { Slot } from "@/lib/sync/slot";
import { slotKey } from "@/lib/sync/slot-key";
import { usePhotographs } from "../photograph/use-photographs";
import { type OwnReading, useOwnReadings } from "./use-own-readings";
import { useSaving } from "./use-saving";
import { useUnfinishedEntry } from "./use-unfinished-entry";

/** Either a new reading, or a correction of one that this phone took. */
type Intent = { readonly of: Pick<OwnReading, "reading" | "head"> | null };
type Kept<T> = { readonly intent: Intent | null; readonly form: T };
export type Saved = { readonly value: ReadingValue; readonly reading: string; readonly head: string; readonly corrected: boolean };

/** One slot on this phone: what was read in it, what is being typed, and the saving of it. */
export function useReading<T>(sheet: JobSheet, author: string, slot: Slot, empty: T) {
  const key = slotKey(slot);
  const own = useOwnReadings(sheet.test.id);
  const { entry, change, drop, settled } = useUnfinishedEntry<Kept<T>>(sheet.test.id, key, { intent: null, form: empty });
  const [saved, setSaved] = useState<Saved | null>(null);
  const photographs = usePhotographs(sheet.test.id, key);
  const { saving, failed, append, tryAgain } = useSaving(completed, (draft, id) => {
    setSaved(savedFrom(draft, id));
    if (draft.type === "void") void drop();
    else navigator.vibrate?.([60, 40, 60]);
  });
  const act = { test: sheet.test.id, jobTag: sheet.tag, author, slot, reason: null };

  async function completed(draft: EventDraft): Promise<EventDraft> {
    await settled();
    if ((draft.type !== "record" && draft.type !== "correct") || draft.photographs) return draft;
    const names = await photographs.names();
    return names.length > 0 ? { ...draft, photographs: [...names] } : draft;
  }

  function save(value: ReadingValue) {
    return append(readingDraft(act, value, entry?.intent?.of ?? null));
  }

  function takeBack({ reading, head }: Pick<Saved, "reading" | "head">, reason: string) {
    return append({ ...act, type: "void", reading, base: head, payload: {}, source: null, reason, capturedAt: now() });
  }

  function begin(intent: Intent, form: T) {
    setSaved(null);
    change({ intent, form });
  }

  return {
    ready: own !== undefined && entry !== null,
    own: own ?? [],
    standing: (own ?? []).filter((each) => each.slotKey === key),
    form: entry?.form ?? empty,
    intent: entry?.intent ?? null,
    // a key pressed while the reading is on its way to the disk would bring the entry back to life
    type: (form: T) => saving || change({ intent: entry?.intent ?? { of: null }, form }),
    begin,
    save,
    saved,
    saving,
    failed,
    tryAgain,
    takeBack,
    photographs,
  };
}

type Act = Pick<EventDraft, "test" | "jobTag" | "author" | "reason"> & { slot: Slot };

function readingDraft(act: Act, payload: ReadingValue, of: Intent["of"]): EventDraft {
  const common = { ...act, payload, source: "station", capturedAt: now() } as const;
  return of === null
    ? { ...common, type: "record", reading: newReadingId(), base: null }
    : { ...common, type: "correct", reading: of.reading, base: of.head };
}

/** What the large word stands for; nothing after a reading was taken back. */
function savedFrom(draft: EventDraft, head: string): Saved | null {
  if (draft.type !== "record" && draft.type !== "correct") return null;
  return { value: draft.payload, reading: draft.reading, head, corrected: draft.type === "correct" };
}

function now(): string {
  return new Date().toISOString();
}
