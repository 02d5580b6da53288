"use client";

import type { BattenEntry, Leg } from "./batten-entry";
import { Choice } from "./mode-switch";

/** Which leg of the U-tube the digits go to: port on the left, starboard on the right. */
export function LegSwitch({ form, onChange }: { form: BattenEntry; onChange: (leg: Leg) => void }) {
  return (
    <fieldset className="grid grid-cols-2 overflow-hidden rounded border-2 border-ink">
      <legend className="sr-only">Leg</legend>
      <Choice label="P leg" chosen={form.leg === "port"} onChoose={() => onChange("port")} />
      <Choice label="S leg" chosen={form.leg === "starboard"} onChoose={() => onChange("starboard")} />
    </fieldset>
  );
}
