"use client";

import { type FormEvent, useEffect, useState } from "react";
import { Button } from "@/components/ui/button";
import { TextField } from "@/components/ui/text-field";
import { codeInAddress, isWholeCode, writtenCode } from "./code-in-address";
import type { Enrolment, Step } from "./use-enrolment";

type JoinFormProps = { enrolment: Enrolment & { enrol: (code: string, deviceName: string) => Promise<void> }; ready: boolean };

const words: Record<Step, string> = {
  idle: "Enrol this phone",
  refused: "Try again",
  "signing-in": "Making the key and signing in",
  fetching: "Fetching the job sheet",
  keeping: "Keeping the pages for work without signal",
  done: "Done",
};

/** The code, and what the lead calls this phone. */
export function JoinForm({ enrolment, ready }: JoinFormProps) {
  const [code, setCode] = useState("");
  const [name, setName] = useState("");
  useEffect(() => {
    setCode(codeInAddress(location));
    // the code is used once: it must not stay in the history
    if (location.hash || location.search) history.replaceState(null, "", "/join");
  }, []);
  const busy = !["idle", "refused"].includes(enrolment.step);
  const complete = isWholeCode(code) && name.trim() !== "";
  const submit = (event: FormEvent) => {
    event.preventDefault();
    if (complete && ready && !busy) void enrolment.enrol(code, name.trim());
  };
  return (
    <form onSubmit={submit} className="flex flex-col gap-4" noValidate>
      <TextField
        id="code"
        label="Code"
        hint="Eight letters and figures from the lead, or scan the lead's QR code with the camera."
        placeholder="ABCD-EFGH"
        autoComplete="off"
        autoCapitalize="characters"
        spellCheck={false}
        value={code}
        onChange={(event) => setCode(writtenCode(event.target.value))}
        className="!min-h-16 text-center font-mono !text-figure tracking-widest"
      />
      <TextField
        id="phone-name"
        label="What this phone is called"
        hint="So that the wheelhouse knows which one is silent."
        placeholder="Blue phone, aft"
        autoComplete="off"
        maxLength={80}
        value={name}
        onChange={(event) => setName(event.target.value)}
        className="!min-h-key"
      />
      <Button type="submit" weight="now" disabled={!complete || !ready || busy} className="min-h-16 w-full !text-large">
        {words[enrolment.step]}
      </Button>
    </form>
  );
}
