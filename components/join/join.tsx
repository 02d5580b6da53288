"use client";

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
  if (enrolment.step === "done") return <Enrolled enrolment={enrolment} />;
  return (
    <div className="flex flex-1 flex-col gap-4">
      <h1 className="font-bold text-title">Enrol this phone</h1>
      <JoinForm enrolment={enrolment} ready={checks !== null && mayStart(checks)} />
      {enrolment.sentence ? <Notice tone="refused">{enrolment.sentence}</Notice> : null}
      <section aria-labelledby="self-test" className="mt-auto flex flex-col gap-2 border-ink-line border-t pt-3">
        <h2 id="self-test" className="font-bold">
          What this phone can do
        </h2>
        <SelfTestList checks={checks} />
      </section>
    </div>
  );
}
