"use client";

import { useState } from "react";
import { useServiceWorker } from "@/components/readings/shell/use-service-worker";
import { Notice } from "@/components/ui/notice";
import { Enrolled } from "./enrolled";
import { JoinForm } from "./join-form";
import { mayStart } from "./self-test";
import { SelfTestList } from "./self-test-list";
import { useEnrolment } from "./use-enrolment";
import { useSelfTest } from "./use-self-test";

/** Enrolling a phone: it tests itself, makes its key, signs in by its code and fetches its job sheets. */
export function Join() {
  useServiceWorker();
  const checks = useSelfTest();
  const enrolment = useEnrolment();
  const [opened, setOpened] = useState(false);
  if (enrolment.step === "done") return <Enrolled enrolment={enrolment} />;
  return (
    <div className="flex flex-1 flex-col gap-4">
      <h1 className="font-bold text-title">Enrol this phone</h1>
      <JoinForm enrolment={enrolment} ready={checks !== null && mayStart(checks)} />
      {enrolment.sentence ? <Notice tone="refused">{enrolment.sentence}</Notice> : null}
      <details
        open={opened || (checks !== null && !checks.every(({ passed }) => passed))}
        onToggle={(event) => setOpened(event.currentTarget.open)}
      >
        <summary className="min-h-tap py-2 font-bold">
          {checks === null ? "Self-test" : `Self-test: ${checks.filter(({ passed }) => passed).length} of ${checks.length} passed`}
        </summary>
        <SelfTestList checks={checks} />
      </details>
    </div>
  );
}
