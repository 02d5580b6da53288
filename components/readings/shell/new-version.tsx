"use client";

import { useState } from "react";
import { Button } from "@/components/ui/button";
import { useServiceWorker } from "./use-service-worker";

/** A new version waits until the person agrees and no entry is unfinished. */
export function NewVersion() {
  const { waiting, changeOver } = useServiceWorker();
  const [refused, setRefused] = useState(false);
  if (!waiting) return null;
  return (
    <div className="flex items-center gap-3 border-ink-line border-b bg-sailcloth-sunken px-3 py-1 text-small">
      <p className="flex-1">{refused ? "Finish or clear the entry you are typing first." : "A new version is ready."}</p>
      <Button className="!text-small" onClick={async () => setRefused(!(await changeOver()))}>
        Change over
      </Button>
    </div>
  );
}
