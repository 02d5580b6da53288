"use client";

import type { ReactNode } from "react";
import type { PadKey } from "./typed-keys";
import { usePadKeyboard } from "./use-pad-keyboard";

type NumberPadProps = {
  onKey: (key: PadKey) => void;
  /** the scale goes below zero */
  signed: boolean;
  /** what the corner key does: take this mark and start the next; left out where one number is all */
  next?: { readonly label: string; readonly enabled: boolean; readonly onNext: () => void };
};

const rows: readonly (readonly PadKey[])[] = [
  ["1", "2", "3", "backspace"],
  ["4", "5", "6", "clear"],
  ["7", "8", "9", "sign"],
  [",", "0", "."],
];

const faces: Partial<Record<PadKey, { face: ReactNode; name: string }>> = {
  backspace: { face: <BackspaceSign />, name: "Delete the last digit" },
  clear: { face: <span className="font-sans text-base">Clear</span>, name: "Clear" },
  sign: { face: "±", name: "Change sign" },
  ",": { face: ",", name: "Decimal comma" },
  ".": { face: ".", name: "Decimal point" },
};

/** Keys for a gloved thumb: the system keyboard never comes up. */
export function NumberPad({ onKey, signed, next }: NumberPadProps) {
  usePadKeyboard(onKey, next?.enabled ? next.onNext : null);
  return (
    <fieldset className="grid grid-cols-4 gap-1.5">
      <legend className="sr-only">Number pad</legend>
      {rows.flat().map((key) => (
        <Key key={key} name={key} disabled={key === "sign" && !signed} onKey={onKey} />
      ))}
      {next ? <NextKey {...next} /> : <span aria-hidden="true" />}
    </fieldset>
  );
}

function Key({ name, disabled, onKey }: { name: PadKey; disabled: boolean; onKey: (key: PadKey) => void }) {
  const special = faces[name];
  const look = special && name !== "," && name !== "." ? "bg-sailcloth text-ink-soft" : "bg-sailcloth-raised text-ink";
  return (
    <button
      type="button"
      disabled={disabled}
      aria-label={special?.name ?? name}
      onClick={() => onKey(name)}
      className={`${keyClass} ${look} text-[1.75rem] disabled:opacity-35`}
    >
      {special?.face ?? name}
    </button>
  );
}

function BackspaceSign() {
  return (
    <svg viewBox="0 0 28 20" className="mx-auto h-5 w-7" aria-hidden="true">
      <path
        d="M9 2h16a1.5 1.5 0 0 1 1.5 1.5v13A1.5 1.5 0 0 1 25 18H9L2 10Z"
        fill="none"
        stroke="currentColor"
        strokeWidth="2"
        strokeLinejoin="round"
      />
      <path d="M13.5 6.5l7 7m0-7l-7 7" stroke="currentColor" strokeWidth="2" strokeLinecap="round" />
    </svg>
  );
}

function NextKey({ label, enabled, onNext }: { label: string; enabled: boolean; onNext: () => void }) {
  return (
    <button
      type="button"
      disabled={!enabled}
      onClick={onNext}
      className={`${keyClass} border-ink bg-ink font-bold text-sailcloth text-small leading-tight disabled:border-ink-line disabled:bg-sailcloth-sunken disabled:text-ink-soft`}
    >
      {label}
    </button>
  );
}

const keyClass =
  "min-h-key min-w-key select-none touch-manipulation rounded border border-ink-line active:translate-y-px active:bg-batten active:text-batten-ink";
