"use client";

import { zodResolver } from "@hookform/resolvers/zod";
import { useEffect, useState } from "react";
import { useForm } from "react-hook-form";
import { Button } from "@/components/ui/button";
import { ChoiceField } from "@/components/ui/choice-field";
import type { TestRecord } from "@/lib/record/test-record";
import type { ReadingDue } from "@/lib/sync/live";
import { entryKind, isCalledByRadio, type RadioReading, type RadioTyped, radioEmpty, radioSchema } from "./radio-entry";
import { slotInWords } from "./slot-in-words";
import { SwingMode } from "./swing-mode";
import { ValueFields } from "./value-fields";

type RadioFormProps = {
  due: readonly ReadingDue[];
  stations: TestRecord["stations"];
  /** the slot that is asked for first: the next one due */
  first: string | null;
  onRecord: (reading: RadioReading) => Promise<void>;
};

/** Types in what is called over the radio; it counts until the station's own reading arrives. */
export function RadioForm({ due, stations, first, onRecord }: RadioFormProps) {
  const called = due.filter(isCalledByRadio);
  const [saved, setSaved] = useState<string | null>(null);
  const form = useForm<RadioTyped, unknown, RadioReading>({
    resolver: zodResolver(radioSchema(called, stations)),
    defaultValues: { slotKey: first ?? "", ...radioEmpty },
  });
  const { setValue } = form;
  useEffect(() => setValue("slotKey", first ?? ""), [first, setValue]);
  const chosen = called.find((each) => each.slotKey === form.watch("slotKey"));
  const kind = chosen ? entryKind(chosen.slot, stations) : null;
  const save = form.handleSubmit(async (reading) => {
    await onRecord(reading);
    setSaved(slotInWords(reading.slot));
    form.reset({ slotKey: "", ...radioEmpty });
  });
  return (
    <form onSubmit={save} noValidate className="flex flex-col gap-3">
      <ChoiceField id="radio-slot" label="Reading called" error={form.formState.errors.slotKey?.message} {...form.register("slotKey")}>
        <option value="">Choose the reading</option>
        <Slots title="Due" due={called.filter((each) => each.state === "empty")} />
        <Slots title="Already read" due={called.filter((each) => each.state !== "empty")} />
      </ChoiceField>
      {kind ? <ValueFields id="radio" kind={kind} errors={form.formState.errors} register={form.register} /> : null}
      {kind === "swing" || kind === "angle" ? <SwingMode register={form.register} /> : null}
      <div className="flex flex-wrap items-center gap-3">
        <Button type="submit">Take in by radio</Button>
        <output className="text-small">{saved ? `Saved: ${saved}.` : ""}</output>
      </div>
    </form>
  );
}

function Slots({ title, due }: { title: string; due: readonly ReadingDue[] }) {
  if (due.length === 0) return null;
  return (
    <optgroup label={title}>
      {due.map((each) => (
        <option key={each.slotKey} value={each.slotKey}>
          {slotInWords(each.slot)}
        </option>
      ))}
    </optgroup>
  );
}
