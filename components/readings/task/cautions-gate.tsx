"use client";

import { type ReactNode, useState } from "react";
import { Button } from "@/components/ui/button";
import { cautionsOf, type Task, taskNames } from "./cautions";
import { useDeviceNote } from "./use-device-note";

type CautionsGateProps = { task: Task; test: string; person: string; children: ReactNode };

/** The cautions of a task, confirmed one by one by each person before the first reading of a test; remembered on the phone. */
export function CautionsGate({ task, test, person, children }: CautionsGateProps) {
  const confirmed = useDeviceNote(`cautions|${test}|${person}|${task}`);
  const [ticked, setTicked] = useState<readonly string[]>([]);
  if (confirmed.value === undefined) return null;
  if (confirmed.value !== null) return children;
  const cautions = cautionsOf[task];
  const toggle = (caution: string) =>
    setTicked(ticked.includes(caution) ? ticked.filter((each) => each !== caution) : [...ticked, caution]);
  return (
    <section className="flex flex-1 flex-col gap-3" aria-labelledby="cautions">
      <h1 id="cautions" className="font-bold text-title">
        {taskNames[task]}: before you start
      </h1>
      {cautions.map((caution) => (
        <Caution key={caution} text={caution} ticked={ticked.includes(caution)} onToggle={() => toggle(caution)} />
      ))}
      <Button
        weight="now"
        disabled={ticked.length < cautions.length}
        onClick={() => confirmed.keep(new Date().toISOString())}
        className="mt-auto min-h-16 w-full text-large"
      >
        {ticked.length < cautions.length ? "Confirm each caution" : "Start reading"}
      </Button>
    </section>
  );
}

function Caution({ text, ticked, onToggle }: { text: string; ticked: boolean; onToggle: () => void }) {
  return (
    <label
      className={`flex min-h-key cursor-pointer items-center gap-3 rounded border-2 px-3 py-3 text-large ${ticked ? "border-ink bg-sailcloth-raised" : "border-redlead bg-redlead-wash"}`}
    >
      <input type="checkbox" checked={ticked} onChange={onToggle} className="h-7 w-7 shrink-0 accent-[var(--ink)]" />
      {text}
    </label>
  );
}
