"use client";

import Link from "next/link";
import { photographsOwedInWords, queueWords } from "@/lib/sync/queue-words";
import { type Queue, useQueue } from "./use-queue";

/** The state of the queue, always in words; a tap leads to everything the phone holds. Its place never changes size. */
export function QueueLine() {
  const queue = useQueue();
  const urgent = queue !== undefined && (queue.reach === "sign-in-needed" || queue.count.quarantined > 0);
  return (
    <Link href="/readings/held" className="flex h-11 min-w-0 flex-1 items-center gap-2 text-small leading-tight">
      <Dot unsent={(queue?.count.unsent ?? 0) + (queue?.photographs ?? 0)} />
      <span aria-live="polite" className={`line-clamp-2 min-w-0 ${urgent ? "font-bold text-redlead-text" : "text-ink"}`}>
        {queue ? wordsOf(queue) : "Looking at what this phone holds"}
      </span>
    </Link>
  );
}

function wordsOf({ count, reach, photographs }: Queue): string {
  return [queueWords(count, reach), photographsOwedInWords(photographs)].filter((words) => words !== "").join("; ");
}

// a full dot: something waits here; an open one: nothing does
function Dot({ unsent }: { unsent: number }) {
  return <span aria-hidden="true" className={`h-3 w-3 shrink-0 rounded-full border-2 border-ink ${unsent > 0 ? "bg-ink" : ""}`} />;
}
