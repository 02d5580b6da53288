"use client";

import type { ReactNode } from "react";
import { Cell, ColumnHead, DataTable, RowHead } from "@/components/ui/data-table";
import { TimeOfDay } from "@/components/ui/time-of-day";
import type { TestRecord } from "@/lib/record/test-record";
import type { ReadingDue, StandingReading } from "@/lib/sync/live";
import type { LeadActs } from "./lead-acts";
import { offTheFit } from "./off-the-fit";
import { Photographs, sameReading } from "./photographs";
import { ReadingFigure } from "./reading-figure";
import { ResolveForm } from "./resolve-form";
import { slotInWords } from "./slot-in-words";

type DisagreementProps = { due: ReadingDue; record: TestRecord; acts: LeadActs | null };

/** The readings of one slot side by side: what, how far off what the others say, who, when by both clocks, how; and the form that settles them. */
export function Disagreement({ due, record, acts }: DisagreementProps) {
  const heads = headsOf(due);
  const off = offTheFit(record, due.slot, heads);
  const hasFit = off.some((each) => each !== null);
  const hasPhotographs = due.readings.some(({ photographs }) => photographs !== undefined);
  return (
    <div className="mt-2 grid gap-4 lg:grid-cols-2">
      <DataTable caption={`Readings that disagree: ${slotInWords(due.slot)}`}>
        <thead>
          <tr>
            <ColumnHead>Reading</ColumnHead>
            <ColumnHead figure>Value</ColumnHead>
            {hasFit ? <ColumnHead figure>{due.slot.kind === "batten" ? "Off the line" : "Off the waterline"}</ColumnHead> : null}
            <ColumnHead>Who</ColumnHead>
            <ColumnHead>When</ColumnHead>
            <ColumnHead>How</ColumnHead>
            {hasPhotographs ? <ColumnHead>Photographs</ColumnHead> : null}
          </tr>
        </thead>
        <tbody>
          {heads.map((head, index) => (
            <HeadRow key={head.event} head={head} letter={letterOf(index)} due={due} off={hasFit ? (off[index] ?? "not known") : null}>
              {hasPhotographs ? (
                <Cell>
                  <Photographs slot={due.slot} of={sameReading(head, due.readings)} />
                </Cell>
              ) : null}
            </HeadRow>
          ))}
        </tbody>
      </DataTable>
      {acts ? <ResolveForm due={due} heads={heads} stations={record.stations} onResolve={acts.resolve} /> : null}
    </div>
  );
}

type HeadRowProps = { head: StandingReading; letter: string; due: ReadingDue; off: string | null; children: ReactNode };

function HeadRow({ head, letter, due, off, children }: HeadRowProps) {
  return (
    <tr>
      <RowHead>{letter}</RowHead>
      <Cell figure>
        <ReadingFigure value={head.value} kind={due.slot.kind} />
      </Cell>
      {off === null ? null : <Cell figure>{off}</Cell>}
      <Cell>{head.author}</Cell>
      <Cell>
        <TimeOfDay at={head.capturedAt} />
        <span className="block text-ink-soft text-small">
          here <TimeOfDay at={head.receivedAt} />
        </span>
      </Cell>
      <Cell>
        {head.source === "station" ? "at the station" : head.source === "radio" ? "by radio" : "from paper"}
        {head.corrected ? ", corrected" : ""}
        {head.late ? ", late" : ""}
        {head.status === "void" ? ", taken back" : ""}
      </Cell>
      {children}
    </tr>
  );
}

/** Every head that a decision must name. */
export function headsOf(due: ReadingDue): StandingReading[] {
  const disagreeing = due.readings.filter((reading) => reading.status === "disagrees");
  return disagreeing.length > 1 ? disagreeing : due.readings.filter((reading) => reading.status !== "superseded");
}

export function letterOf(index: number): string {
  return String.fromCharCode(65 + index);
}
