"use client";

import { Button } from "@/components/ui/button";
import { Notice } from "@/components/ui/notice";
import { useStorageLoss } from "./use-storage-loss";

/** Says at once that the browser emptied the store, so that the lead can explain the gap while people remember it. */
export function StorageLoss() {
  const { loss, seen } = useStorageLoss();
  if (!loss) return null;
  return (
    <div className="p-3">
      <Notice tone="refused" title="This phone's store was emptied">
        <p>
          Events {loss.from} to {loss.to} were saved on this phone and are no longer here. What had been sent is safe on the server. Tell
          the lead now, then enrol the phone again.
        </p>
        <Button className="mt-2" onClick={seen}>
          I have told the lead
        </Button>
      </Notice>
    </div>
  );
}
