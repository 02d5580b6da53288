"use client";

import { useRef, useState } from "react";
import { Button } from "@/components/ui/button";
import { Notice } from "@/components/ui/notice";
import { type PhoneFileTaken, usePhoneFile } from "./use-phone-file";

/** Reads the file in that a phone has exported, where it could never send. */
export function PhoneFile() {
  const input = useRef<HTMLInputElement>(null);
  const takeIn = usePhoneFile();
  const [taken, setTaken] = useState<PhoneFileTaken | null>(null);
  const take = async (file: File | undefined) => {
    if (!file) return;
    setTaken(await takeIn(file));
    if (input.current) input.current.value = "";
  };
  return (
    <div className="mt-4 flex flex-col gap-3 border-ink-line border-t pt-4">
      <input
        ref={input}
        type="file"
        accept="application/json,.json"
        className="sr-only"
        tabIndex={-1}
        aria-label="File of a phone"
        onChange={(event) => take(event.target.files?.[0])}
      />
      <div>
        <Button onClick={() => input.current?.click()}>Read a phone’s file in</Button>
      </div>
      <div aria-live="polite">{taken ? <Taken taken={taken} /> : null}</div>
    </div>
  );
}

function Taken({ taken }: { taken: PhoneFileTaken }) {
  if (taken.type === "refused") return <Notice tone="refused">{taken.sentence}</Notice>;
  const { phone, events, setAside, hasUnsaved, photographs, photographsLeft } = taken;
  return (
    <Notice title={`${phone}: ${events} ${events === 1 ? "event is" : "events are"} here now`}>
      {photographs > 0 ? <p>{photographs === 1 ? "1 photograph has" : `${photographs} photographs have`} come with them.</p> : null}
      {photographsLeft > 0 ? (
        <p>
          {photographsLeft === 1 ? "1 photograph is" : `${photographsLeft} photographs are`} on the phone only: keep the phone as it is.
        </p>
      ) : null}
      {setAside > 0 ? <p>{setAside} of them are set aside: see what needs your decision.</p> : null}
      {hasUnsaved ? <p>The phone could not save its last reading: take it in from paper.</p> : null}
    </Notice>
  );
}
