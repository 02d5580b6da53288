"use client";

import { useRouter } from "next/navigation";
import type { BattenValue } from "@/lib/inclining/test-readings";
import { slotKey } from "@/lib/sync/slot-key";
import { DueOfTask } from "../due/due-of-task";
import { ReadingFlow } from "../task/reading-flow";
import { SheetGate } from "../task/sheet-gate";
import { battenSlot, slotHref } from "../task/slot-query";
import type { SheetHere } from "../task/use-job-sheet";
import { emptyBattenEntry, entryOfBatten } from "./batten-entry";
import { BattenHead } from "./batten-head";
import { battenInWords } from "./batten-in-words";
import { BattenScreen } from "./batten-screen";
import { NextMove } from "./next-move";

/** Reading a pendulum's batten, a U-tube or an inclinometer at one move. */
export function BattenTask() {
  return <SheetGate task="batten">{(here, query) => <BattenReading here={here} query={query} />}</SheetGate>;
}

function BattenReading({ here, query }: { here: SheetHere; query: URLSearchParams }) {
  const router = useRouter();
  const slot = battenSlot(query, here.sheet);
  const station = here.sheet.stations.find(({ id }) => id === slot?.station);
  const move = here.sheet.moves.find(({ no }) => no === slot?.move);
  if (!slot || !station || !move) return <DueOfTask task="batten" here={here} />;
  return (
    <>
      <BattenHead station={station} move={move} repeat={slot.repeat} />
      <ReadingFlow
        key={slotKey(slot)}
        here={here}
        slot={slot}
        empty={emptyBattenEntry(station.instrument)}
        formOf={(value) => entryOfBatten(value as BattenValue, station.instrument)}
        shown={(value) => battenInWords(value as BattenValue)}
        next={<NextMove here={here} station={station} after={slot.move} />}
        onRepeat={() => router.push(slotHref(here.sheet.test.id, { ...slot, repeat: slot.repeat + 1 }))}
      >
        {(entry) => <BattenScreen entry={entry} station={station} move={slot.move} />}
      </ReadingFlow>
    </>
  );
}
