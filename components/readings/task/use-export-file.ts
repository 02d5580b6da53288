import { useState } from "react";
import type { EventDraft } from "@/db/device/append-event";
import { exportFile } from "@/db/device/export-file";

/** Hands all events of this phone to the person as a file. */
export function useExportFile(unsaved: EventDraft | null = null) {
  const [saved, setSaved] = useState(false);
  const saveFile = async () => {
    const file = await exportFile(unsaved);
    const link = document.createElement("a");
    link.href = URL.createObjectURL(file);
    link.download = file.name;
    link.click();
    setTimeout(() => URL.revokeObjectURL(link.href), 60_000);
    setSaved(true);
  };
  return { saveFile, saved };
}
