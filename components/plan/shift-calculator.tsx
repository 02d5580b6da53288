"use client";

import { useState } from "react";
import { ChoiceField } from "@/components/ui/choice-field";
import { Panel } from "@/components/ui/panel";
import { QuantityField } from "@/components/ui/quantity-field";
import type { ClassicalTerm } from "@/lib/inclining/classical-relation";
import { figure } from "@/lib/report/rounding";
import { type ShiftTyped, shiftFields, solvedTerm } from "./shift-terms";

type Known = { readonly displacement: number; readonly gmFluid: number };

/** One shift: any of its terms from the others, for choosing weights, distances and lengths. Small heels, upright sides. */
export function ShiftCalculator({ known }: { known: Known | undefined }) {
  const [wanted, setWanted] = useState<ClassicalTerm>("weight");
  const [typed, setTyped] = useState<ShiftTyped>(() => startOf(known));
  const solved = solvedTerm(wanted, typed);
  const { label, unit } = shiftFields.find(({ term }) => term === wanted) ?? { label: "", unit: "" };
  return (
    <Panel title="One shift, any term">
      <div className="mb-4 max-w-60">
        <ChoiceField id="shift-wanted" label="Find" value={wanted} onChange={(event) => setWanted(event.target.value as ClassicalTerm)}>
          {shiftFields.map(({ term, label }) => (
            <option key={term} value={term}>
              {label}
            </option>
          ))}
        </ChoiceField>
      </div>
      <div className="grid gap-x-6 gap-y-3 sm:grid-cols-2">
        {shiftFields
          .filter(({ term }) => term !== wanted)
          .map(({ term, label, unit }) => (
            <QuantityField
              key={term}
              id={`s-${term}`}
              label={label}
              unit={unit}
              value={typed[term]}
              onChange={(event) => setTyped({ ...typed, [term]: event.target.value })}
            />
          ))}
      </div>
      <p role="status" className="mt-4 border-ink border-t-2 pt-3">
        <span className="text-ink-soft">{label}: </span>
        {"figure" in solved ? (
          <strong className="text-title">
            {solved.figure} {unit}
          </strong>
        ) : (
          solved.sentence
        )}
      </p>
      <p className="mt-2 text-ink-soft text-small">
        GM·Δ·tan(heel) = weight·distance, tan(heel) = deflection/length: for small heels of a ship with upright sides.
      </p>
    </Panel>
  );
}

function startOf(known: Known | undefined): ShiftTyped {
  const none = { weight: "", distance: "8", tanHeel: "2", length: "4", deflection: "" };
  return {
    ...none,
    displacement: known ? figure(known.displacement, 0) : "",
    gmFluid: known ? figure(known.gmFluid, 2) : "",
  };
}
