"use client";

import Link from "next/link";
import { buttonClass } from "@/components/ui/button";
import type { JobSheet } from "@/lib/sync/job-sheet";
import type { Slot } from "@/lib/sync/slot";
import { slotKey } from "@/lib/sync/slot-key";
import { slotHref } from "../task/slot-query";
import { useDeviceNote } from "../task/use-device-note";
import type { SheetHere } from "../task/use-job-sheet";

type MyStationProps = { here: SheetHere; read: ReadonlySet<string> };

/** The station this phone stands at, and its next move under one large key. */
export function MyStation({ here, read }: MyStationProps) {
  const { sheet } = here;
  const note = useDeviceNote(`station|${sheet.test.id}`);
  if (note.value === undefined || sheet.stations.length === 0) return null;
  const mine = sheet.stations.find(({ id }) => id === note.value) ?? (sheet.stations.length === 1 ? sheet.stations[0] : undefined);
  const next = mine && nextMove(sheet, mine, read);
  return (
    <section aria-labelledby="my-station" className="flex flex-col gap-2 rounded border-2 border-ink bg-sailcloth-raised p-3">
      <h2 id="my-station" className="text-small">
        {mine ? "Your station" : "Which station do you read?"}
      </h2>
      <div className="flex flex-wrap gap-2">
        {sheet.stations.map(({ id }) => (
          <button
            key={id}
            type="button"
            aria-pressed={id === mine?.id}
            onClick={() => note.keep(id)}
            className={`min-h-key min-w-key rounded border-2 px-3 font-bold text-large ${id === mine?.id ? "border-ink bg-ink text-sailcloth" : "border-ink-line"}`}
          >
            {id}
          </button>
        ))}
      </div>
      {mine ? <p className="text-ink-soft text-small">{mine.place ?? mine.instrument}</p> : null}
      {next ? (
        <Link href={slotHref(sheet.test.id, next)} className={`${buttonClass("now")} min-h-16 w-full !text-title`}>
          Read move {next.move}
          {next.repeat > 1 ? `, repeat ${next.repeat}` : ""}
        </Link>
      ) : null}
      {mine && !next ? <p className="font-bold">Every move is read at station {mine.id}.</p> : null}
    </section>
  );
}

/** The open move if it is unread here, else the first unread one. */
function nextMove(sheet: JobSheet, station: JobSheet["stations"][number], read: ReadonlySet<string>) {
  const slots = sheet.moves.map(({ no, repeat, state }) => ({
    state,
    slot: { kind: "batten", move: no, repeat, station: station.id, series: station.series } as const satisfies Slot,
  }));
  const unread = slots.filter(({ slot }) => !read.has(slotKey(slot)));
  return (unread.find(({ state }) => state === "open") ?? unread[0])?.slot;
}
