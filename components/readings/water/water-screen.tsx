"use client";

import { NumberPad } from "../pad/number-pad";
import { typedAfter } from "../pad/typed-keys";
import type { Entry } from "../task/reading-flow";
import { SaveBar } from "../task/save-bar";
import { FieldButton } from "./field-button";
import { type WaterEntry, waterSentence, waterValue } from "./water-entry";

type WaterScreenProps = { entry: Entry<WaterEntry>; hydrometers: readonly string[] };

/** Density, which hydrometer, and the sample's temperature, on one pad. */
export function WaterScreen({ entry, hydrometers }: WaterScreenProps) {
  const { form, type } = entry;
  const value = waterValue(form, hydrometers);
  return (
    <div className="flex flex-1 flex-col gap-2">
      <Hydrometers names={hydrometers} chosen={form.hydrometer} onChoose={(hydrometer) => type({ ...form, hydrometer })} />
      <div className="grid grid-cols-[3fr_2fr] gap-2">
        <FieldButton
          label="Density"
          unit="t/m³"
          typed={form.density}
          active={form.field === "density"}
          onChoose={() => type({ ...form, field: "density" })}
        />
        <FieldButton
          label="Temperature"
          unit="°C"
          typed={form.temperature}
          active={form.field === "temperature"}
          onChoose={() => type({ ...form, field: "temperature" })}
        />
      </div>
      <div className="mt-auto flex flex-col gap-1.5">
        <NumberPad
          signed={form.field === "temperature"}
          onKey={(key) => type({ ...form, [form.field]: typedAfter(form[form.field], key) })}
        />
        <SaveBar
          refusal={value.ok ? null : waterSentence(value.refusal)}
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

type HydrometersProps = { names: readonly string[]; chosen: string | null; onChoose: (name: string) => void };

function Hydrometers({ names, chosen, onChoose }: HydrometersProps) {
  if (names.length === 0) return null;
  return (
    <fieldset className="flex flex-wrap gap-2">
      <legend className="pb-1 text-ink-soft text-small">Hydrometer</legend>
      {names.map((name) => (
        <button
          key={name}
          type="button"
          aria-pressed={name === chosen}
          onClick={() => onChoose(name)}
          className={`min-h-key min-w-key rounded border-2 px-4 font-bold ${name === chosen ? "border-ink bg-ink text-sailcloth" : "border-ink-line"}`}
        >
          {name}
        </button>
      ))}
    </fieldset>
  );
}
