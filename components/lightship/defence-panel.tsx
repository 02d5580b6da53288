"use client";

import { Button } from "@/components/ui/button";
import { Panel } from "@/components/ui/panel";
import type { TestRecord } from "@/lib/record/test-record";
import type { lightshipDigits } from "@/lib/report/result-digits";
import { BudgetTable } from "./budget-table";
import { IntervalTable } from "./interval-table";
import type { useDefence } from "./use-defence";

type DefencePanelProps = {
  record: TestRecord;
  defence: ReturnType<typeof useDefence>;
  digits: ReturnType<typeof lightshipDigits>;
};

/** How far the lightship can be trusted, and what to measure better. */
export function DefencePanel({ record, defence, digits }: DefencePanelProps) {
  const { stop, start, ...state } = defence;
  return (
    <Panel title="How well it is known" aside={state.type === "done" ? `${state.defence.draws} draws` : undefined}>
      {state.type === "drawing" ? <Drawing share={state.share} onStop={stop} /> : null}
      {state.type === "stopped" ? (
        <div className="flex flex-wrap items-center gap-4">
          <p>The intervals were not worked out.</p>
          <Button onClick={start}>Work them out</Button>
        </div>
      ) : null}
      {state.type === "done" ? (
        <div className="grid items-start gap-6 lg:grid-cols-2">
          <IntervalTable intervals={state.defence.interval95} digits={digits} isAssumed={record.uncertainty === undefined} />
          <BudgetTable budget={state.defence.budget} />
        </div>
      ) : null}
    </Panel>
  );
}

function Drawing({ share, onStop }: { share: number; onStop: () => void }) {
  return (
    <div className="flex flex-wrap items-center gap-4">
      <label className="flex min-w-60 flex-1 items-center gap-3">
        Drawing
        <progress value={share} max={1} className="h-3 flex-1 accent-redlead" />
      </label>
      <Button onClick={onStop}>Stop</Button>
    </div>
  );
}
