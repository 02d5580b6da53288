"use client";

import { useState } from "react";
import { TextField } from "@/components/ui/text-field";
import type { ReadingDue } from "@/lib/sync/live";
import { standing } from "./cell-signs";
import type { LeadActs } from "./lead-acts";
import { type Measured, PositionsForm } from "./positions-form";

/** A weight measured once more: a correction with its reason, the earlier place stays readable. */
export function PositionAgain({ due, acts }: { due: ReadingDue; acts: LeadActs }) {
  const [reason, setReason] = useState("");
  const [wanting, setWanting] = useState(false);
  const { slot } = due;
  const [now] = standing(due);
  if (slot.kind !== "position" || !now || !("place" in now.value) || due.state === "disagrees") return null;
  const correct = async ([measured]: readonly Measured[]) => {
    setWanting(reason.trim() === "");
    if (measured && reason.trim() !== "") await acts.correct(now, slot, { place: measured.place }, reason.trim());
  };
  return (
    <div className="mt-3 flex flex-col gap-3">
      <TextField
        id={`again-${slot.weight}-${slot.move}`}
        label="Why it is measured again"
        value={reason}
        onChange={(event) => setReason(event.target.value)}
        error={wanting ? "Write the reason: it stands in the ledger beside your name." : undefined}
      />
      <PositionsForm key={now.event} move={slot.move} planned={{ [slot.weight]: now.value.place }} due={[due]} onMeasured={correct} />
    </div>
  );
}
