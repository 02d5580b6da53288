import { useState } from "react";
import { v7 as newReadingId } from "uuid";
import { appendEvent, type EventDraft } from "@/db/device/append-event";
import type { ReadingValue } from "@/lib/sync/event";
import type { JobSheet } from "@/lib/sync/job-sheet";
import type { Slot } from "@/lib/sync/slot";
import { slotKey } from "@/lib/sync/slot-key";
import { announceSaved } from "@/worker/sync-client";
import { type OwnReading, useOwnReadings } from "./use-own-readings";
import { useUnfinishedEntry } from "./use-unfinished-entry";

/** Either a new reading, or a correction of one that this phone took. */
type Intent = { readonly of: Pick<OwnReading, "reading" | "head"> | null };
type Kept<T> = { readonly intent: Intent | null; readonly form: T };
export type Saved = { readonly value: ReadingValue; readonly reading: string; readonly head: string; readonly corrected: boolean };

/** A draft that the phone's store refused. */
export type Failure = { readonly draft: EventDraft };

/** One slot on this phone: what was read in it, what is being typed, and the saving of it. */
export function useReading<T>(sheet: JobSheet, author: string, slot: Slot, empty: T) {
  const key = slotKey(slot);
  const own = useOwnReadings(sheet.test.id);
  const { entry, change, drop, settled } = useUnfinishedEntry<Kept<T>>(sheet.test.id, key, { intent: null, form: empty });
  const [saved, setSaved] = useState<Saved | null>(null);
  const [saving, setSaving] = useState(false);
  const [failed, setFailed] = useState<Failure | null>(null);
  const standing = own?.filter((each) => each.slotKey === key);

  const act = { test: sheet.test.id, jobTag: sheet.tag, author, slot, reason: null };

  async function append(draft: EventDraft, then: (head: string) => void) {
    setSaving(true);
    setFailed(null);
    await settled();
    try {
      const event = await appendEvent(draft);
      then(event.id);
      announceSaved();
    } catch {
      setFailed({ draft });
    }
    setSaving(false);
  }

  function save(value: ReadingValue) {
    const of = entry?.intent?.of ?? null;
    const reading = of?.reading ?? newReadingId();
    const draft = readingDraft(act, value, reading, of?.head ?? null);
    return append(draft, (head) => {
      setSaved({ value, reading, head, corrected: of !== null });
      navigator.vibrate?.([60, 40, 60]);
    });
  }

  function takeBack({ reading, head }: Pick<Saved, "reading" | "head">, reason: string) {
    const draft = { ...act, type: "void", reading, base: head, payload: {}, source: null, reason, capturedAt: now() } as const;
    return append(draft, () => {
      setSaved(null);
      void drop();
    });
  }

  function begin(intent: Intent, form: T) {
    setSaved(null);
    change({ intent, form });
  }

  return {
    ready: own !== undefined && entry !== null,
    own: own ?? [],
    standing: standing ?? [],
    form: entry?.form ?? empty,
    intent: entry?.intent ?? null,
    // a key pressed while the reading is on its way to the disk would bring the entry back to life
    type: (form: T) => saving || change({ intent: entry?.intent ?? { of: null }, form }),
    begin,
    drop,
    save,
    saved,
    saving,
    failed,
    tryAgain: () => failed && append(failed.draft, (head) => setSaved(savedFrom(failed.draft, head))),
    takeBack,
  };
}

type Act = Pick<EventDraft, "test" | "jobTag" | "author" | "reason"> & { slot: Slot };

function readingDraft(act: Act, payload: ReadingValue, reading: string, base: string | null): EventDraft {
  const common = { ...act, reading, payload, source: "station", capturedAt: now() } as const;
  return base === null ? { ...common, type: "record", base } : { ...common, type: "correct", base };
}

function savedFrom(draft: EventDraft, head: string): Saved | null {
  if (draft.type !== "record" && draft.type !== "correct") return null;
  return { value: draft.payload, reading: draft.reading, head, corrected: draft.type === "correct" };
}

function now(): string {
  return new Date().toISOString();
}
