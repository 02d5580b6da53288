"use client";

import type { BattenMode } from "@/lib/inclining/test-readings";

type ModeSwitchProps = { mode: BattenMode; onChange: (mode: BattenMode) => void };

/** Whether the bob hangs still, or its swing is read at the turning points. */
export function ModeSwitch({ mode, onChange }: ModeSwitchProps) {
  return (
    <fieldset className="grid grid-cols-2 overflow-hidden rounded border-2 border-ink">
      <legend className="sr-only">How it is read</legend>
      <Choice label="Settled" chosen={mode === "settled"} onChoose={() => onChange("settled")} />
      <Choice label="Turning points" chosen={mode === "turning-points"} onChoose={() => onChange("turning-points")} />
    </fieldset>
  );
}

function Choice({ label, chosen, onChoose }: { label: string; chosen: boolean; onChoose: () => void }) {
  return (
    <button
      type="button"
      aria-pressed={chosen}
      onClick={onChoose}
      className={`min-h-tap px-1 text-small leading-tight ${chosen ? "bg-ink font-bold text-sailcloth" : "text-ink"}`}
    >
      {label}
    </button>
  );
}
