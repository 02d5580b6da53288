"use client";

import { useState } from "react";
import { Decisions } from "@/components/control/decisions";
import type { LeadActs } from "@/components/control/lead-acts";
import { Panel } from "@/components/ui/panel";
import type { LiveSnapshot } from "@/lib/sync/live";
import { type DueFilter, dueFilters, isShown } from "./due-filters";
import { DueTable } from "./due-table";
import { StatePanel } from "./state-panel";

type ReconcileBoardProps = { test: string; snapshot: LiveSnapshot; acts: LeadActs | null };

/** What is owed on top, then every reading due in one table, then the state of the test. */
export function ReconcileBoard({ test, snapshot, acts }: ReconcileBoardProps) {
  const [filter, setFilter] = useState<DueFilter>("all");
  const shown = snapshot.due.filter((due) => isShown(due, filter));
  return (
    <>
      <Decisions snapshot={snapshot} acts={acts} />
      <Panel title="Readings due" aside={`${shown.length} of ${snapshot.due.length}`}>
        <fieldset className="mb-3 flex flex-wrap gap-2">
          <legend className="sr-only">Which to show</legend>
          {dueFilters.map(({ id, label }) => (
            <button
              key={id}
              type="button"
              aria-pressed={filter === id}
              onClick={() => setFilter(id)}
              className={`min-h-tap rounded border-2 px-3 text-small ${filter === id ? "border-ink bg-ink font-bold text-sailcloth" : "border-ink-line"}`}
            >
              {label} {snapshot.due.filter((due) => isShown(due, id)).length}
            </button>
          ))}
        </fieldset>
        <DueTable due={shown} acts={acts} />
      </Panel>
      <StatePanel test={test} snapshot={snapshot} />
    </>
  );
}
