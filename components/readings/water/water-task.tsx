"use client";

import { figure } from "@/lib/report/rounding";
import { slotKey } from "@/lib/sync/slot-key";
import { DueOfTask } from "../due/due-of-task";
import { NextDue } from "../due/next-due";
import { ReadingFlow } from "../task/reading-flow";
import { SheetGate } from "../task/sheet-gate";
import { waterSlot } from "../task/slot-query";
import { TaskHead } from "../task/task-head";
import type { SheetHere } from "../task/use-job-sheet";
import { emptyWater, entryOfWater, type WaterValue } from "./water-entry";
import { WaterScreen } from "./water-screen";

/** The density of the water the ship floats in, by hydrometer, at one place and depth. */
export function WaterTask() {
  return <SheetGate task="water">{(here, query) => <WaterReading here={here} query={query} />}</SheetGate>;
}

function WaterReading({ here, query }: { here: SheetHere; query: URLSearchParams }) {
  const slot = waterSlot(query, here.sheet);
  if (!slot) return <DueOfTask task="water" here={here} />;
  return (
    <>
      <TaskHead over="Water" title={slot.place} place={`sample from ${slot.depth} m below the surface`} when={`${slot.round} the moves`} />
      <ReadingFlow
        key={slotKey(slot)}
        here={here}
        slot={slot}
        empty={emptyWater(here.sheet.hydrometers)}
        formOf={(value) => entryOfWater(value as WaterValue)}
        shown={(value) => `${figure((value as WaterValue).density, 4)} t/m³`}
        next={<NextDue task="water" here={here} after={slot} />}
      >
        {(entry) => <WaterScreen entry={entry} hydrometers={here.sheet.hydrometers} />}
      </ReadingFlow>
    </>
  );
}
