"use client";

import { useMemo } from "react";
import { Quantity } from "@/components/ui/quantity";
import type { TestRecord } from "@/lib/record/test-record";
import { heeledTooFar, mostHeelDegrees } from "./heel-stop";
import { lineSoFar } from "./line-so-far";

/** In large type, when the ship heels more than a test may take her. */
export function StopSign({ record }: { record: TestRecord }) {
  const tooFar = useMemo(() => {
    const so = lineSoFar(record);
    return so.ok ? heeledTooFar(so.value.line.moves) : [];
  }, [record]);
  const worst = tooFar.at(-1);
  if (!worst) return null;
  return (
    <div role="alert" className="rounded border-4 border-redlead bg-redlead-wash px-5 py-4">
      <p className="font-bold text-signal">Stop</p>
      <p className="text-large">
        At move {worst.no} she heeled <Quantity value={(Math.atan(worst.tanHeel) * 180) / Math.PI} unit="°" decimals={1} signed />, more
        than {mostHeelDegrees}°. Bring the weights back; find out why before any further move.
      </p>
    </div>
  );
}
