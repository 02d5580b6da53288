"use client";

import { NumberPad } from "../pad/number-pad";
import type { Entry } from "../task/reading-flow";
import { SaveBar } from "../task/save-bar";
import { TypedDigits } from "../task/typed-digits";
import { type BattenEntry, battenValue, legValues, type Station, withKey, withMarkTaken, withoutMark } from "./batten-entry";
import { BattenHero } from "./batten-hero";
import { entrySentence } from "./entry-sentence";
import { ModeSwitch } from "./mode-switch";
import { secondLookAt } from "./second-look";

type BattenScreenProps = { entry: Entry<BattenEntry>; station: Station; move: number };

/** The strip, the digits, the pad, and save: one hand, one screen. */
export function BattenScreen({ entry, station, move }: BattenScreenProps) {
  const { form, type, own } = entry;
  const unit = station.instrument === "inclinometer" ? "°" : "mm";
  const value = battenValue(form, station);
  const swinging = form.mode === "turning-points";
  const count = legValues(form, form.leg).length;
  return (
    <div className="flex flex-1 flex-col gap-2">
      <BattenHero form={form} station={station} unit={unit} own={own} onLeg={(leg) => type({ ...form, leg })} />
      <ModeSwitch mode={form.mode} onChange={(mode) => type({ ...form, mode })} />
      <TypedDigits
        typed={form.typing[form.leg]}
        unit={unit}
        taken={form.marks[form.leg]}
        onDrop={(index) => type(withoutMark(form, index))}
      />
      <div className="mt-auto flex flex-col gap-1.5">
        <NumberPad
          signed={station.scale[0] < 0}
          onKey={(key) => type(withKey(form, key))}
          next={{
            label: swinging ? "Next turn" : "Next mark",
            enabled: form.typing[form.leg] !== "" && count > form.marks[form.leg].length,
            onNext: () => type(withMarkTaken(form)),
          }}
        />
        <SaveBar
          refusal={value.ok ? null : entrySentence(value.refusal, unit)}
          ready={value.ok}
          secondLook={value.ok ? secondLookAt(value.value, station, move, own) : null}
          saving={entry.saving}
          label={entry.correcting ? "Save correction" : "Save"}
          onSave={() => value.ok && entry.save(value.value)}
        />
      </div>
    </div>
  );
}
