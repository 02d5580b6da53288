"use client";

import { useEffect, useRef } from "react";
import { Button } from "@/components/ui/button";
import { useExportFile } from "./use-export-file";
import type { Failure } from "./use-saving";

type StorageAlarmProps = { failure: Failure; shown: string; onTryAgain: () => void };

/** The phone could not save: nothing else can be done on it until the reading is safe somewhere. */
export function StorageAlarm({ failure, shown, onTryAgain }: StorageAlarmProps) {
  const dialog = useRef<HTMLDialogElement>(null);
  const { saveFile, saved } = useExportFile(failure.draft);
  useEffect(() => dialog.current?.showModal(), []);
  return (
    <dialog
      ref={dialog}
      onCancel={(event) => event.preventDefault()}
      aria-labelledby="alarm"
      className="m-auto w-[calc(100%-1.5rem)] max-w-hand rounded-lg border-4 border-redlead bg-sailcloth-raised p-4 text-ink backdrop:bg-black/70"
    >
      <h2 id="alarm" className="font-bold text-redlead-text text-title">
        Not saved
      </h2>
      <p className="mt-2 text-large">This phone's store refused three times. The reading stands here and nowhere else:</p>
      <p className="my-3 text-center text-figure">{shown}</p>
      <p>Write it on paper and call it out to the lead. Then save the export file, which holds it too, and try again.</p>
      <div className="mt-4 flex flex-col gap-2">
        <Button className="min-h-key w-full" onClick={saveFile}>
          {saved ? "Export file saved" : "Save the export file"}
        </Button>
        <Button weight="now" className="min-h-key w-full" onClick={onTryAgain}>
          Try again
        </Button>
      </div>
    </dialog>
  );
}
