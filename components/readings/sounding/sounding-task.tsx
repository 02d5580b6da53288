"use client";

import { Notice } from "@/components/ui/notice";
import { figure } from "@/lib/report/rounding";
import { slotKey } from "@/lib/sync/slot-key";
import { DueOfTask } from "../due/due-of-task";
import { NextDue } from "../due/next-due";
import { ReadingFlow } from "../task/reading-flow";
import { SheetGate } from "../task/sheet-gate";
import { tankSlot } from "../task/slot-query";
import { TaskHead } from "../task/task-head";
import type { SheetHere } from "../task/use-job-sheet";
import { emptySounding, entryOfSounding, type SoundingValue } from "./sounding-entry";
import { SoundingScreen } from "./sounding-screen";

/** Sounding a tank, or taking its ullage, before and after the moves, or at a move where ballast shifts. */
export function SoundingTask() {
  return <SheetGate task="sounding">{(here, query) => <SoundingReading here={here} query={query} />}</SheetGate>;
}

function SoundingReading({ here, query }: { here: SheetHere; query: URLSearchParams }) {
  const slot = tankSlot(query, here.sheet);
  const tank = here.sheet.tanks.find(({ id }) => id === slot?.tank);
  if (!slot || !tank) return <DueOfTask task="sounding" here={here} />;
  const measure = tank.measure === "ullage" ? "Ullage" : "Sounding";
  const when = slot.kind === "ballast" ? `at move ${slot.move}` : `${slot.round} the moves`;
  return (
    <>
      <TaskHead over={measure} title={tank.id} place={tank.contents} when={when} />
      {tank.gasDangerous ? <Notice tone="caution">Gas may be here. An uncertified phone stays away: call the number out.</Notice> : null}
      <ReadingFlow
        key={slotKey(slot)}
        here={here}
        slot={slot}
        empty={emptySounding}
        formOf={(value) => entryOfSounding(value as SoundingValue)}
        shown={(value) => `${measure} ${figure((value as SoundingValue).value, 3)} m`}
        next={<NextDue task="sounding" here={here} after={slot} />}
      >
        {(entry) => <SoundingScreen entry={entry} measure={tank.measure} />}
      </ReadingFlow>
    </>
  );
}
