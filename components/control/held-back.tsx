"use client";

import { useState } from "react";
import { Button } from "@/components/ui/button";
import { TextField } from "@/components/ui/text-field";
import type { Quarantined } from "@/lib/sync/live";
import type { LeadActs } from "./lead-acts";

/** An event that was set aside on arrival: kept as it came, and let in only by a person with a reason. */
export function HeldBack({ held, acts }: { held: Quarantined; acts: LeadActs | null }) {
  const [reason, setReason] = useState("");
  const { event } = held;
  if (!acts || event === null) return <p className="mt-1">It is kept as it came, and takes no part in the result.</p>;
  return (
    <div className="mt-2 flex flex-wrap items-end gap-3">
      <div className="min-w-60 flex-1">
        <TextField
          id={`release-${held.serverSeq}`}
          label="Why it may be let in"
          value={reason}
          onChange={(change) => setReason(change.target.value)}
        />
      </div>
      <Button disabled={reason.trim() === ""} onClick={() => acts.release(event, reason.trim())}>
        Let it in
      </Button>
    </div>
  );
}
