"use client";

import type { ReactNode } from "react";
import { Button } from "@/components/ui/button";
import { TimeOfDay } from "@/components/ui/time-of-day";
import type { ReadingValue } from "@/lib/sync/event";
import type { SlotKind } from "@/lib/sync/slot";
import { TakeBack } from "./take-back";
import type { OwnReading } from "./use-own-readings";

type AgainChoiceProps = {
  kind: SlotKind;
  readings: readonly OwnReading[];
  shown: (value: ReadingValue) => string;
  next: ReactNode;
  onSecondLook: () => void;
  onRepeat?: (() => void) | undefined;
  onCorrect: () => void;
  onTakeBack: (reason: string) => void;
};

/** This phone has read this place already: what the next reading is must be said before it is taken. */
export function AgainChoice({ kind, readings, shown, next, onSecondLook, onRepeat, onCorrect, onTakeBack }: AgainChoiceProps) {
  return (
    <div className="flex flex-1 flex-col gap-3">
      <section aria-labelledby="read-here" className="rounded border-2 border-ink bg-sailcloth-raised p-3">
        <h2 id="read-here" className="font-bold">
          {kind === "note" ? "Noted with this phone" : "Read with this phone"}
        </h2>
        <ul className="mt-1 flex flex-col gap-1">
          {readings.map((each) => (
            <li key={each.reading} className="flex items-baseline justify-between gap-3">
              <span className="text-title">{shown(each.value)}</span>
              <span className="text-ink-soft text-small">
                {each.corrected ? "corrected, " : ""}
                <TimeOfDay at={each.capturedAt} />
              </span>
            </li>
          ))}
        </ul>
      </section>
      {kind === "note" ? (
        <Choice title="Another note" text="Each note stands for itself." onChoose={onSecondLook} />
      ) : (
        <Choice title="Second look" text="The same state of the ship, read once more. Both stand." onChoose={onSecondLook} />
      )}
      {onRepeat ? <Choice title="Repeat ordered" text="The lead has ordered this move again." onChoose={onRepeat} /> : null}
      <div className="flex flex-wrap gap-2">
        <TakeBack onTakeBack={onTakeBack} />
        <Button className="min-h-key flex-1" onClick={onCorrect}>
          Correct
        </Button>
      </div>
      <div className="mt-auto">{next}</div>
    </div>
  );
}

function Choice({ title, text, onChoose }: { title: string; text: string; onChoose: () => void }) {
  return (
    <button
      type="button"
      onClick={onChoose}
      className="flex min-h-16 flex-col items-start justify-center rounded border-2 border-ink px-4 py-2 text-left active:translate-y-px"
    >
      <span className="font-bold text-large">{title}</span>
      <span className="text-ink-soft">{text}</span>
    </button>
  );
}
