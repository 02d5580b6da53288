"use client";

import { useState } from "react";
import type { LeadActs } from "@/components/control/lead-acts";
import { Photographs } from "@/components/control/photographs";
import { ReadingFigure } from "@/components/control/reading-figure";
import { Button } from "@/components/ui/button";
import { TextField } from "@/components/ui/text-field";
import { TimeOfDay } from "@/components/ui/time-of-day";
import type { ReadingDue, StandingReading } from "@/lib/sync/live";

type ReadingHistoryProps = { due: ReadingDue; acts: LeadActs | null };

/** Every value that was ever given for a reading due, with who and when by both clocks; what stands can be taken back. */
export function ReadingHistory({ due, acts }: ReadingHistoryProps) {
  return (
    <ol className="flex flex-col gap-2">
      {due.readings.map((reading) => (
        <li key={reading.event} className="rounded border border-ink-line px-3 py-2 text-small">
          <p className="flex flex-wrap items-baseline justify-between gap-x-3">
            <strong className="text-base">
              <ReadingFigure value={reading.value} kind={due.slot.kind} />
            </strong>
            <span>{statusInWords(reading)}</span>
          </p>
          <p>
            {reading.author}, {howItCame(reading)}; read <TimeOfDay at={reading.capturedAt} dated /> by the phone, received{" "}
            <TimeOfDay at={reading.receivedAt} dated />
          </p>
          <Photographs slot={due.slot} of={[reading]} />
          {acts && reading.status === "accepted" ? <TakeBack due={due} reading={reading} acts={acts} /> : null}
        </li>
      ))}
    </ol>
  );
}

function TakeBack({ due, reading, acts }: { due: ReadingDue; reading: StandingReading; acts: LeadActs }) {
  const [reason, setReason] = useState<string | null>(null);
  if (reason === null) {
    return (
      <Button weight="quiet" onClick={() => setReason("")}>
        Take it out
      </Button>
    );
  }
  return (
    <div className="mt-1 flex flex-wrap items-end gap-2">
      <div className="min-w-48 flex-1">
        <TextField
          id={`void-${reading.event}`}
          label="Why it does not count"
          value={reason}
          onChange={(event) => setReason(event.target.value)}
        />
      </div>
      <Button disabled={reason.trim() === ""} onClick={() => acts.takeBack(reading, due.slot, reason.trim())}>
        Take it out
      </Button>
    </div>
  );
}

function statusInWords({ status, corrected, late, capturedAfterClose }: StandingReading): string {
  const stands = { accepted: "counts", superseded: "replaced", void: "taken back", disagrees: "disagrees" }[status];
  const words = [stands, corrected ? "a correction" : null, capturedAfterClose ? "read after the close" : late ? "came late" : null];
  return words.filter((word) => word !== null).join(", ");
}

function howItCame({ source }: StandingReading): string {
  return { station: "at the station", radio: "by radio", paper: "from paper" }[source];
}
