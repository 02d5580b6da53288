"use client";

import { type ReactNode, useState } from "react";
import { Button } from "./button";

type ConfirmButtonProps = { children: ReactNode; question: string; yes: string; onConfirm: () => void; disabled?: boolean };

/** A button that asks once more in place, for what cannot be taken back without a trace. */
export function ConfirmButton({ children, question, yes, onConfirm, disabled = false }: ConfirmButtonProps) {
  const [asking, setAsking] = useState(false);
  if (!asking) {
    return (
      <Button disabled={disabled} onClick={() => setAsking(true)}>
        {children}
      </Button>
    );
  }
  const confirm = () => {
    setAsking(false);
    onConfirm();
  };
  return (
    <fieldset className="flex flex-wrap items-center gap-2 rounded border-2 border-redlead px-3 py-1">
      <legend className="sr-only">Confirm</legend>
      <span className="text-small">{question}</span>
      <Button weight="now" onClick={confirm}>
        {yes}
      </Button>
      <Button weight="quiet" onClick={() => setAsking(false)}>
        No, leave it
      </Button>
    </fieldset>
  );
}
