"use client";

import { figure } from "@/lib/report/rounding";
import { slotKey } from "@/lib/sync/slot-key";
import { DueOfTask } from "../due/due-of-task";
import { NextDue } from "../due/next-due";
import { ReadingFlow } from "../task/reading-flow";
import { SheetGate } from "../task/sheet-gate";
import { markSlot } from "../task/slot-query";
import { TaskHead } from "../task/task-head";
import type { SheetHere } from "../task/use-job-sheet";
import { emptyMarkEntry, entryOfMark, type MarkValue } from "./mark-entry";
import { MarkScreen } from "./mark-screen";

/** Reading a draft mark or a freeboard, from the boat or the quay. */
export function MarkTask() {
  return <SheetGate task="draft">{(here, query) => <MarkReading here={here} query={query} />}</SheetGate>;
}

function MarkReading({ here, query }: { here: SheetHere; query: URLSearchParams }) {
  const slot = markSlot(query, here.sheet);
  if (!slot) return <DueOfTask task="draft" here={here} />;
  const marks = slot.kind === "draft" ? here.sheet.draftMarks : here.sheet.freeboardMarks;
  const place = marks.find(({ id }) => id === slot.mark)?.place ?? "";
  return (
    <>
      <TaskHead
        over={slot.kind === "draft" ? "Draft mark" : "Freeboard"}
        title={slot.mark}
        place={place}
        when={`${slot.round} the moves`}
      />
      <ReadingFlow
        key={slotKey(slot)}
        here={here}
        slot={slot}
        empty={emptyMarkEntry}
        formOf={(value) => entryOfMark(value as MarkValue)}
        shown={(value) => `${figure((value as MarkValue).value, 3)} m`}
        next={<NextDue task="draft" here={here} after={slot} />}
      >
        {(entry) => <MarkScreen entry={entry} kind={slot.kind} />}
      </ReadingFlow>
    </>
  );
}
