"use client";

type FieldButtonProps = { label: string; unit: string; typed: string; active: boolean; onChoose: () => void };

/** A number on a screen that holds more than one: a tap sends the pad's digits here. */
export function FieldButton({ label, unit, typed, active, onChoose }: FieldButtonProps) {
  return (
    <button
      type="button"
      aria-pressed={active}
      onClick={onChoose}
      className={`flex h-24 flex-col justify-between rounded border-2 px-3 py-2 text-left ${active ? "border-ink bg-sailcloth-raised" : "border-ink-line"}`}
    >
      <span className="text-ink-soft text-small">{label}</span>
      <span className="text-figure leading-none">
        {typed}
        {active ? <span aria-hidden="true" className="ml-0.5 inline-block h-7 w-[3px] translate-y-1 bg-redlead" /> : null}
      </span>
      <span className="self-end text-ink-soft text-small">{unit}</span>
    </button>
  );
}
