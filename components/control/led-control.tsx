"use client";

import { useMemo } from "react";
import { Button } from "@/components/ui/button";
import { Notice } from "@/components/ui/notice";
import { Panel } from "@/components/ui/panel";
import type { ControlProps } from "./control";
import { ControlBoard } from "./control-board";
import { EnrolForm } from "./enrol-form";
import { LinkState } from "./link-state";
import { PhoneFile } from "./phone-file";
import { snapshotWithUnsent } from "./snapshot-with-unsent";
import { useEnrolmentCodes } from "./use-enrolment-codes";
import { useLeadActs } from "./use-lead-acts";
import { type LeadDevice, useLeadDevice } from "./use-lead-device";
import { useLiveTest } from "./use-live-test";
import { useSending } from "./use-sending";
import { useStopPhone } from "./use-stop-phone";

/** Central control in the hands of those who order: what they do is saved on this device first. */
export function LedControl({ test, person, first }: ControlProps) {
  useSending();
  const { snapshot, link } = useLiveTest(test, first);
  const makeCode = useEnrolmentCodes(test);
  const stopPhone = useStopPhone(test);
  const { device, prepare } = useLeadDevice(test, person.id);
  const { acts, unsent, failed } = useLeadActs({ test, person: person.id, jobTag: device.state === "ready" ? device.jobTag : "" });
  const seen = useMemo(() => snapshotWithUnsent(snapshot, unsent), [snapshot, unsent]);
  return (
    <ControlBoard
      snapshot={seen}
      stopPhone={stopPhone}
      acts={device.state === "ready" ? acts : null}
      orders={<Preparing device={device} prepare={prepare} />}
      link={
        <>
          <LinkState link={link} unsent={unsent.length} />
          {failed ? <Notice tone="refused">{failed}</Notice> : null}
        </>
      }
      enrol={
        <Panel title="Enrol a phone, or read its file">
          <EnrolForm onMake={makeCode} />
          <PhoneFile />
        </Panel>
      }
    />
  );
}

/** Orders come from a device that the server knows, like every reading. */
function Preparing({ device, prepare }: { device: LeadDevice; prepare: () => void }) {
  if (device.state !== "stranger") return null;
  return (
    <div className="flex max-w-hand flex-col gap-2">
      <p>This device gives no orders yet: it needs its own key and this test's job sheet.</p>
      <div>
        <Button weight="now" disabled={device.busy} onClick={prepare}>
          {device.busy ? "Making it ready" : "Give orders from this device"}
        </Button>
      </div>
      {device.refused ? <Notice tone="refused">{device.refused}</Notice> : null}
    </div>
  );
}
