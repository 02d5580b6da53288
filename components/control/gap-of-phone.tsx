"use client";

import { useState } from "react";
import { Button } from "@/components/ui/button";
import { TextField } from "@/components/ui/text-field";
import type { Phone } from "@/lib/sync/live";
import type { LeadActs } from "./lead-acts";

/** A phone that has taken more than has arrived: waited for, or written off where it never comes back. */
export function GapOfPhone({ phone, acts }: { phone: Phone; acts: LeadActs | null }) {
  const [reason, setReason] = useState("");
  return (
    <div className="mt-1 flex flex-col gap-2">
      <p>The phone still holds them. Bring it near the ship's network, or have its file read in.</p>
      {acts ? (
        <div className="flex max-w-hand flex-wrap items-end gap-3">
          <div className="min-w-60 flex-1">
            <TextField
              id={`off-${phone.device}`}
              label="Why nobody waits for it"
              value={reason}
              onChange={(event) => setReason(event.target.value)}
            />
          </div>
          <Button disabled={reason.trim() === ""} onClick={() => acts.writeOff(phone.device, reason.trim())}>
            Write it off
          </Button>
        </div>
      ) : null}
    </div>
  );
}
