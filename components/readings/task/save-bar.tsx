"use client";

import { useState } from "react";
import { Button } from "@/components/ui/button";

type SaveBarProps = {
  /** why it can't be saved as it stands; null where it can, or where nothing needs to be said yet */
  refusal: string | null;
  ready: boolean;
  /** what to look at again before it is saved */
  secondLook: string | null;
  saving: boolean;
  label?: string;
  onSave: () => void;
};

/** Save, within thumb reach, and above it the one sentence that stands in its way. Its height never changes. */
export function SaveBar({ refusal, ready, secondLook, saving, label = "Save", onSave }: SaveBarProps) {
  const [lookedAt, setLookedAt] = useState<string | null>(null);
  const asks = secondLook !== null && lookedAt === secondLook;
  const press = () => {
    if (secondLook !== null && !asks) setLookedAt(secondLook);
    else onSave();
  };
  return (
    <div className="flex flex-col gap-1.5">
      <Sentence refusal={refusal} secondLook={asks ? secondLook : null} />
      <Button weight="now" disabled={!ready || saving} onClick={press} className="min-h-16 w-full !text-title">
        {saving ? "Saving" : asks ? "I looked again: save" : label}
      </Button>
    </div>
  );
}

function Sentence({ refusal, secondLook }: { refusal: string | null; secondLook: string | null }) {
  const words = refusal ?? (secondLook ? `Look again. ${secondLook}` : "");
  return (
    <p
      role="status"
      className={`flex min-h-11 items-center rounded px-2 text-small leading-tight ${words ? "border-redlead border-l-4 bg-redlead-wash text-ink" : ""}`}
    >
      {words}
    </p>
  );
}
