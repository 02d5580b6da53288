"use client";

import { slotKey } from "@/lib/sync/slot-key";
import { type Task, taskNames } from "../task/cautions";
import type { SheetHere } from "../task/use-job-sheet";
import { BattenGrid } from "./batten-grid";
import { sheetSlots, slotGroup, slotName } from "./sheet-slots";
import { SlotLink } from "./slot-link";
import { useReadKeys } from "./use-read-keys";

/** Everything due of one task, under the round it belongs to. */
export function DueOfTask({ task, here }: { task: Task; here: SheetHere }) {
  const read = useReadKeys(here.sheet.test.id);
  const slots = sheetSlots(here.sheet, task);
  const groups = [...new Set(slots.map(slotGroup))];
  if (!read) return null;
  return (
    <section aria-labelledby="due" className="flex flex-col gap-3 py-2">
      <h1 id="due" className="font-bold text-title">
        {taskNames[task]}
      </h1>
      {task === "batten" ? <BattenGrid sheet={here.sheet} read={read} /> : null}
      {task === "batten"
        ? null
        : groups.map((group) => (
            <div key={group} className="flex flex-col gap-2">
              <h2 className="text-ink-soft text-small">{group}</h2>
              <div className="grid grid-cols-2 gap-2">
                {slots
                  .filter((slot) => slotGroup(slot) === group)
                  .map((slot) => (
                    <SlotLink
                      key={slotKey(slot)}
                      test={here.sheet.test.id}
                      slot={slot}
                      name={slotName(slot)}
                      read={read.has(slotKey(slot))}
                    />
                  ))}
              </div>
            </div>
          ))}
      {task === "conditions" ? <SlotLink test={here.sheet.test.id} slot={{ kind: "note" }} name="Write a note" read={false} /> : null}
    </section>
  );
}
