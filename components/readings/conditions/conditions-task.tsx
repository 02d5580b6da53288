"use client";

import { lazy, Suspense } from "react";
import { slotKey } from "@/lib/sync/slot-key";
import { DueOfTask } from "../due/due-of-task";
import { NextDue } from "../due/next-due";
import { ReadingFlow } from "../task/reading-flow";
import { SheetGate } from "../task/sheet-gate";
import { conditionSlot } from "../task/slot-query";
import { TaskHead } from "../task/task-head";
import type { SheetHere } from "../task/use-job-sheet";
import { conditionsInWords } from "./conditions-in-words";
import { emptyConditions, formOfConditions } from "./conditions-typed";
import { NoteScreen } from "./note-screen";

// the form's library and the schema are loaded when a form is opened
const ConditionsScreen = lazy(() => import("./conditions-screen").then(({ ConditionsScreen }) => ({ default: ConditionsScreen })));

/** What the weather, the moorings and the people were at a move; or a note in words. */
export function ConditionsTask() {
  return <SheetGate task="conditions">{(here, query) => <ConditionsReading here={here} query={query} />}</SheetGate>;
}

function ConditionsReading({ here, query }: { here: SheetHere; query: URLSearchParams }) {
  const slot = conditionSlot(query, here.sheet);
  if (!slot) return <DueOfTask task="conditions" here={here} />;
  const next = <NextDue task="conditions" here={here} after={slot} />;
  if (slot.kind === "note")
    return (
      <>
        <TaskHead over="Note" title="In your own words" place="what happened, and where" when="any time" />
        <ReadingFlow
          key="note"
          here={here}
          slot={slot}
          empty={{ text: "" }}
          formOf={(value) => value as { text: string }}
          shown={(value) => (value as { text: string }).text}
          next={next}
        >
          {(entry) => <NoteScreen entry={entry} />}
        </ReadingFlow>
      </>
    );
  return (
    <>
      <TaskHead over="Conditions" title={`Move ${slot.move}`} place="as they are while the readings are taken" when="during the moves" />
      <ReadingFlow
        key={slotKey(slot)}
        here={here}
        slot={slot}
        empty={emptyConditions}
        formOf={formOfConditions}
        shown={conditionsInWords}
        next={next}
      >
        {(entry) => (
          <Suspense fallback={null}>
            <ConditionsScreen entry={entry} />
          </Suspense>
        )}
      </ReadingFlow>
    </>
  );
}
