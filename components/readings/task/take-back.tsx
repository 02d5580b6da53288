"use client";

import { useState } from "react";
import { Button } from "@/components/ui/button";

const reasons = ["Mistyped", "Bob or scale disturbed", "Wrong place or move"];

/** Undo: the reading no longer counts, its record stays. The reason is the second tap. */
export function TakeBack({ onTakeBack }: { onTakeBack: (reason: string) => void }) {
  const [open, setOpen] = useState(false);
  if (!open)
    return (
      <Button className="min-h-key flex-1" onClick={() => setOpen(true)}>
        Undo
      </Button>
    );
  return (
    <fieldset className="flex w-full flex-col gap-2 rounded border-2 border-ink p-3">
      <legend className="px-1 font-bold">Undo because</legend>
      {reasons.map((reason) => (
        <Button key={reason} className="min-h-key" onClick={() => onTakeBack(reason)}>
          {reason}
        </Button>
      ))}
      <Button weight="quiet" onClick={() => setOpen(false)}>
        Keep the reading
      </Button>
    </fieldset>
  );
}
