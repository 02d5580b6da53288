"use client";

import { lazy, type ReactNode, Suspense } from "react";
import type { ReadingValue } from "@/lib/sync/event";
import type { Slot, SlotKind } from "@/lib/sync/slot";
import { AgainChoice } from "./again-choice";
import { SavedCard } from "./saved-card";
import { StorageAlarm } from "./storage-alarm";
import type { SheetHere } from "./use-job-sheet";
import type { OwnReading } from "./use-own-readings";
import { useReading } from "./use-reading";

// the keys are there before the camera is
const PhotographStrip = lazy(() => import("../photograph/photograph-strip").then(({ PhotographStrip }) => ({ default: PhotographStrip })));

export type Entry<T> = {
  readonly form: T;
  readonly type: (form: T) => void;
  readonly save: (value: ReadingValue) => void;
  readonly saving: boolean;
  readonly correcting: boolean;
  /** everything this phone has read in the test */
  readonly own: readonly OwnReading[];
};

type ReadingFlowProps<T> = {
  here: SheetHere;
  slot: Slot;
  empty: T;
  /** the form that would give this value again */
  formOf: (value: ReadingValue) => T;
  shown: (value: ReadingValue) => string;
  /** what comes after this reading is saved */
  next: ReactNode;
  /** only where a move can be ordered again */
  onRepeat?: () => void;
  children: (entry: Entry<T>) => ReactNode;
};

/** One reading from the first key to the word "saved", with the ways back: second look, repeat, correction, undo. Keyed by its slot. */
export function ReadingFlow<T>({ here, slot, empty, formOf, shown, next, onRepeat, children }: ReadingFlowProps<T>) {
  const { ready, saved, standing, intent, failed, photographs, ...reading } = useReading(here.sheet, here.person.id, slot, empty);
  const last = standing.at(-1);
  const correct = (of: Pick<OwnReading, "reading" | "head" | "value">) =>
    reading.begin({ of: { reading: of.reading, head: of.head } }, formOf(of.value));
  if (!ready) return null;
  if (saved)
    return (
      <SavedCard
        shown={shown(saved.value)}
        corrected={saved.corrected}
        next={next}
        onChange={() => correct(saved)}
        onTakeBack={(reason) => reading.takeBack(saved, reason)}
      />
    );
  if (last && intent === null)
    return (
      <AgainChoice
        kind={slot.kind}
        readings={standing}
        shown={shown}
        next={next}
        onSecondLook={() => reading.begin({ of: null }, empty)}
        onRepeat={onRepeat}
        onCorrect={() => correct(last)}
        onTakeBack={(reason) => reading.takeBack(last, reason)}
      />
    );
  const correcting = intent?.of != null;
  return (
    <>
      {failed ? <StorageAlarm failure={failed} shown={draftShown(failed.draft.payload, shown)} onTryAgain={reading.tryAgain} /> : null}
      {withPhotographs.includes(slot.kind) ? (
        <Suspense fallback={<div className="-mb-3 h-11" />}>
          <PhotographStrip {...photographs} />
        </Suspense>
      ) : null}
      {children({ ...reading, correcting })}
    </>
  );
}

/** What has a scale or a mark that a picture shows. */
const withPhotographs: readonly SlotKind[] = ["batten", "draft", "freeboard", "sounding", "ballast", "water"];

function draftShown(payload: unknown, shown: (value: ReadingValue) => string): string {
  const isEmpty = Object.keys(payload as object).length === 0;
  return isEmpty ? "taken back" : shown(payload as ReadingValue);
}
