"use client";

import Link from "next/link";
import { buttonClass } from "@/components/ui/button";
import { slotHref } from "../task/slot-query";
import type { SheetHere } from "../task/use-job-sheet";
import type { Station } from "./batten-entry";

type NextMoveProps = { here: SheetHere; station: Station; after: number };

/** The way on: the next move at the same station, or back to what is still due. */
export function NextMove({ here, station, after }: NextMoveProps) {
  const test = here.sheet.test.id;
  const next = here.sheet.moves.find(({ no }) => no > after);
  const slot = next && ({ kind: "batten", move: next.no, repeat: next.repeat, station: station.id, series: station.series } as const);
  return (
    <Link href={slot ? slotHref(test, slot) : `/readings?test=${test}`} className={`${buttonClass("now")} min-h-16 w-full !text-title`}>
      {next ? `Next: move ${next.no}` : "All moves read: what is still due"}
    </Link>
  );
}
