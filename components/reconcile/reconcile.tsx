"use client";

import { useMemo } from "react";
import { LinkState } from "@/components/control/link-state";
import { snapshotWithUnsent } from "@/components/control/snapshot-with-unsent";
import { useLeadActs } from "@/components/control/use-lead-acts";
import { useLeadDevice } from "@/components/control/use-lead-device";
import { useLiveTest } from "@/components/control/use-live-test";
import { useSending } from "@/components/control/use-sending";
import { Button } from "@/components/ui/button";
import { Notice } from "@/components/ui/notice";
import type { LiveSnapshot } from "@/lib/sync/live";
import { ReconcileBoard } from "./reconcile-board";

type ReconcileProps = { test: string; person: { readonly id: string; readonly name: string }; first: LiveSnapshot };

/** Every reading due beside what was read, in the hands of those who decide: each decision is saved on this device first. */
export function Reconcile({ test, person, first }: ReconcileProps) {
  useSending();
  const { snapshot, link } = useLiveTest(test, first);
  const { device, prepare } = useLeadDevice(test, person.id);
  const { acts, unsent, failed } = useLeadActs({ test, person: person.id, jobTag: device.state === "ready" ? device.jobTag : "" });
  const seen = useMemo(() => snapshotWithUnsent(snapshot, unsent), [snapshot, unsent]);
  return (
    <div className="flex flex-col gap-5">
      <LinkState link={link} unsent={unsent.length} />
      {failed ? <Notice tone="refused">{failed}</Notice> : null}
      {device.state === "stranger" ? (
        <Notice title="This device decides nothing yet">
          <p className="mb-2">It needs its own key and this test’s job sheet, so that each decision is signed.</p>
          <Button weight="now" disabled={device.busy} onClick={prepare}>
            {device.busy ? "Making it ready" : "Decide from this device"}
          </Button>
          {device.refused ? <p className="mt-2">{device.refused}</p> : null}
        </Notice>
      ) : null}
      <ReconcileBoard test={test} snapshot={seen} acts={device.state === "ready" ? acts : null} />
    </div>
  );
}
