"use client";

import { useState } from "react";
import { stateInWords } from "@/components/tests/test-state";
import { Button } from "@/components/ui/button";
import { ConfirmButton } from "@/components/ui/confirm-button";
import { Notice } from "@/components/ui/notice";
import { Panel } from "@/components/ui/panel";
import { TextField } from "@/components/ui/text-field";
import type { TestState } from "@/lib/sync/job-sheet";
import type { LiveSnapshot } from "@/lib/sync/live";
import { owedBeforeReconciled } from "@/lib/sync/reconciling";
import { owedInWords } from "./owed-in-words";
import { useTestState } from "./use-test-state";

type Step = { readonly to: TestState; readonly ask: string; readonly yes: string };

const onward: Partial<Record<TestState, Step>> = {
  planning: { to: "open", ask: "From now on readings are taken; names of stations, moves and marks stay.", yes: "Open the test" },
  open: { to: "closed", ask: "Readings are over. What still arrives is kept and counts.", yes: "Close the readings" },
  closed: {
    to: "reconciled",
    ask: "Every reading is accounted for. What arrives after this opens its reading again.",
    yes: "Mark as reconciled",
  },
};
const back: Partial<Record<TestState, TestState>> = { closed: "open", reconciled: "closed" };

/** Where the test stands, what is owed before the next step, and the step itself. */
export function StatePanel({ test, snapshot }: { test: string; snapshot: LiveSnapshot }) {
  const { take, refused, busy } = useTestState(test);
  const [reason, setReason] = useState("");
  const { state } = snapshot;
  const step = onward[state];
  const earlier = back[state];
  const owed = step?.to === "reconciled" ? owedBeforeReconciled(snapshot) : [];
  return (
    <Panel title="State of the test" aside={stateInWords[state]}>
      <div className="flex flex-col gap-4">
        {owed.length > 0 ? (
          <Notice tone="caution" title="Owed before it is reconciled">
            <ul className="list-disc pl-5">
              {owed.map((each) => (
                <li key={JSON.stringify(each)}>{owedInWords(each, snapshot)}</li>
              ))}
            </ul>
          </Notice>
        ) : null}
        {step ? (
          <div>
            <ConfirmButton question={step.ask} yes={step.yes} disabled={busy || owed.length > 0} onConfirm={() => take(step.to, null)}>
              {step.yes}
            </ConfirmButton>
          </div>
        ) : null}
        {earlier ? (
          <div className="flex max-w-hand flex-wrap items-end gap-3">
            <div className="min-w-60 flex-1">
              <TextField id="back-reason" label="Why it goes back" value={reason} onChange={(event) => setReason(event.target.value)} />
            </div>
            <Button disabled={busy || reason.trim() === ""} onClick={() => take(earlier, reason.trim())}>
              Back to {earlier}
            </Button>
          </div>
        ) : null}
        {refused ? <Notice tone="refused">{refused}</Notice> : null}
      </div>
    </Panel>
  );
}
