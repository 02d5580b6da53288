"use client";

import { NumberPad } from "../pad/number-pad";
import { typedAfter } from "../pad/typed-keys";
import type { Entry } from "../task/reading-flow";
import { SaveBar } from "../task/save-bar";
import { TypedDigits } from "../task/typed-digits";
import { type SoundingEntry, soundingSentence, soundingValue } from "./sounding-entry";
import { TankSketch } from "./tank-sketch";

type SoundingScreenProps = { entry: Entry<SoundingEntry>; measure: "sounding" | "ullage" };

/** One length on the tape, in metres. */
export function SoundingScreen({ entry, measure }: SoundingScreenProps) {
  const { form, type } = entry;
  const value = soundingValue(form);
  return (
    <div className="flex flex-1 flex-col gap-2 pt-2">
      <TankSketch measure={measure} />
      <TypedDigits typed={form.typing} unit="m" />
      <div className="mt-auto flex flex-col gap-1.5">
        <NumberPad signed={false} onKey={(key) => type({ typing: typedAfter(form.typing, key) })} />
        <SaveBar
          refusal={value.ok ? null : soundingSentence(value.refusal)}
          ready={value.ok}
          secondLook={null}
          saving={entry.saving}
          label={entry.correcting ? "Save correction" : "Save"}
          onSave={() => value.ok && entry.save(value.value)}
        />
      </div>
    </div>
  );
}
