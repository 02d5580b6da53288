"use client";

import Image from "next/image";
import { useRef } from "react";
import { Button } from "@/components/ui/button";
import { useTimeOfDay } from "@/components/ui/time-of-day";
import type { StandingPhotograph, StandingReading } from "@/lib/sync/live";
import { PHOTOGRAPH_SIDE } from "@/lib/sync/photograph";
import type { Slot } from "@/lib/sync/slot";
import { slotInWords } from "./slot-in-words";

type PhotographsProps = { slot: Slot; of: readonly StandingReading[] };

/** What the readers photographed, small and in a row, each opening large; one that has not arrived says so. */
export function Photographs({ slot, of }: PhotographsProps) {
  const taken = of.flatMap((reading) => (reading.photographs ?? []).map((photograph) => ({ reading, photograph })));
  if (taken.length === 0) return null;
  return (
    <ul className="flex flex-wrap gap-2">
      {taken.map(({ reading, photograph }) => (
        <li key={`${reading.event} ${photograph.sha256}`}>
          <OnePhotograph slot={slot} reading={reading} photograph={photograph} />
        </li>
      ))}
    </ul>
  );
}

/** A reading with all that it was before it was corrected: the photograph was taken with the first. */
export function sameReading(head: StandingReading, all: readonly StandingReading[]): readonly StandingReading[] {
  return all.filter(({ reading }) => reading === head.reading);
}

type OneProps = { slot: Slot; reading: StandingReading; photograph: StandingPhotograph };

function OnePhotograph({ slot, reading, photograph }: OneProps) {
  const dialog = useRef<HTMLDialogElement>(null);
  const taken = useTimeOfDay(reading.capturedAt);
  if (!photograph.hasArrived) return <p className="rounded border border-ink-line px-2 py-1 text-small">photograph not arrived yet</p>;
  const words = `Photograph of ${slotInWords(slot)}, taken ${taken} by ${reading.author}`;
  // it is small already, and shown only to whoever may see it: no other copy of it is made on the server
  const picture = { src: `/api/v1/photographs/${photograph.sha256}`, alt: words, unoptimized: true };
  return (
    <>
      <button type="button" onClick={() => dialog.current?.showModal()} aria-haspopup="dialog" className="block h-14 w-14">
        <Image {...picture} width={56} height={56} className="h-full w-full rounded border border-ink-line object-cover" />
      </button>
      <dialog
        ref={dialog}
        aria-label={words}
        className="m-auto max-h-[95dvh] max-w-[95vw] rounded-lg border-2 border-ink bg-sailcloth-raised p-3 text-ink backdrop:bg-black/70"
      >
        <Image {...picture} width={PHOTOGRAPH_SIDE} height={PHOTOGRAPH_SIDE} className="h-auto max-h-[78dvh] w-auto max-w-full" />
        <div className="mt-2 flex flex-wrap items-center justify-between gap-3">
          <p className="text-small">{words}</p>
          <Button onClick={() => dialog.current?.close()}>Close</Button>
        </div>
      </dialog>
    </>
  );
}
