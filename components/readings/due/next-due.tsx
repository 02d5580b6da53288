"use client";

import Link from "next/link";
import { buttonClass } from "@/components/ui/button";
import type { Slot } from "@/lib/sync/slot";
import { slotKey } from "@/lib/sync/slot-key";
import type { Task } from "../task/cautions";
import { slotHref } from "../task/slot-query";
import type { SheetHere } from "../task/use-job-sheet";
import { sheetSlots, slotName } from "./sheet-slots";
import { useReadKeys } from "./use-read-keys";

type NextDueProps = { task: Task; here: SheetHere; after: Slot };

/** The next reading of the same task that this phone has not taken, or back to all that is due. */
export function NextDue({ task, here, after }: NextDueProps) {
  const test = here.sheet.test.id;
  const read = useReadKeys(test);
  const next = read && nextUnread(sheetSlots(here.sheet, task), read, slotKey(after));
  return (
    <Link href={next ? slotHref(test, next) : `/readings?test=${test}`} className={`${buttonClass("now")} min-h-16 w-full !text-large`}>
      {next ? `Next: ${slotName(next)}` : "What is still due"}
    </Link>
  );
}

function nextUnread(slots: readonly Slot[], read: ReadonlySet<string>, after: string): Slot | undefined {
  const here = slots.findIndex((slot) => slotKey(slot) === after);
  const inOrder = [...slots.slice(here + 1), ...slots.slice(0, Math.max(here, 0))];
  return inOrder.find((slot) => !read.has(slotKey(slot)));
}
