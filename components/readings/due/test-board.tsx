"use client";

import Link from "next/link";
import { Sign } from "@/components/ui/sign";
import { TimeOfDay } from "@/components/ui/time-of-day";
import { slotKey } from "@/lib/sync/slot-key";
import { type Task, taskNames } from "../task/cautions";
import type { SheetHere } from "../task/use-job-sheet";
import { MyStation } from "./my-station";
import { sheetSlots } from "./sheet-slots";
import { useReadKeys } from "./use-read-keys";

const pages: Record<Task, string> = {
  batten: "batten",
  draft: "draft",
  sounding: "sounding",
  water: "water",
  conditions: "conditions",
};

/** What is due of one test: the next move at the reader's own station first, then every task with its count. */
export function TestBoard({ here }: { here: SheetHere }) {
  const { sheet, person, fetchedAt } = here;
  const read = useReadKeys(sheet.test.id);
  if (!read) return null;
  return (
    <div className="flex flex-1 flex-col gap-3 py-1">
      <header>
        <h1 className="font-bold text-title leading-tight">{sheet.vessel.name}</h1>
        <p className="text-ink-soft text-small">
          {sheet.test.place} · {sheet.test.date} · {person.name}
        </p>
      </header>
      <MyStation here={here} read={read} />
      <nav aria-label="Readings due" className="flex flex-col gap-2">
        {(Object.keys(pages) as Task[]).map((task) => (
          <TaskLink key={task} task={task} here={here} read={read} />
        ))}
      </nav>
      <p className="mt-auto pt-2 text-center text-ink-soft text-small">
        Job sheet of <TimeOfDay at={fetchedAt} dated />
      </p>
    </div>
  );
}

function TaskLink({ task, here, read }: { task: Task; here: SheetHere; read: ReadonlySet<string> }) {
  const slots = sheetSlots(here.sheet, task);
  const count = slots.filter((slot) => read.has(slotKey(slot))).length;
  const done = slots.length > 0 && count === slots.length;
  return (
    <Link
      href={`/readings/${pages[task]}?test=${here.sheet.test.id}`}
      className="flex min-h-key items-center justify-between gap-3 rounded border-2 border-ink-line bg-sailcloth-raised px-4 active:translate-y-px"
    >
      <span className="font-bold">{taskNames[task]}</span>
      <span className="flex shrink-0 items-center gap-2 text-ink-soft text-small">
        {task === "conditions" ? null : `${count} of ${slots.length} read here`}
        <Sign kind={done ? "read" : "due"} className="h-4 w-4" />
      </span>
    </Link>
  );
}
