import { useEffect, useState } from "react";
import { deviceDatabase } from "@/db/device/device-database";
import { forgetSentinel, lostFromStore } from "@/db/device/storage-sentinel";

export type Loss = { readonly from: number; readonly to: number };

/** What the browser took out of this phone's store since it was last open; null where nothing is missing. */
export function useStorageLoss() {
  const [loss, setLoss] = useState<Loss | null>(null);
  useEffect(() => {
    let gone = false;
    lostFromStore(deviceDatabase())
      .then((lost) => gone || setLoss(lost))
      .catch(() => undefined);
    return () => {
      gone = true;
    };
  }, []);
  const seen = () => {
    forgetSentinel();
    setLoss(null);
  };
  return { loss, seen };
}
