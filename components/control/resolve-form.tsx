"use client";

import { zodResolver } from "@hookform/resolvers/zod";
import type { ReactNode } from "react";
import { useForm } from "react-hook-form";
import { Button } from "@/components/ui/button";
import { TextField } from "@/components/ui/text-field";
import type { TestRecord } from "@/lib/record/test-record";
import type { ReadingDue, StandingReading } from "@/lib/sync/live";
import { letterOf } from "./disagreement";
import type { LeadActs } from "./lead-acts";
import { entryKind } from "./radio-entry";
import { ReadingFigure } from "./reading-figure";
import { type Resolved, type ResolveTyped, resolveEmpty, resolveSchema } from "./resolve-entry";
import { ValueFields } from "./value-fields";

type ResolveFormProps = {
  due: ReadingDue;
  heads: readonly StandingReading[];
  stations: TestRecord["stations"];
  onResolve: LeadActs["resolve"];
};

/** Settles a disagreement: a choice that names every reading, with its reason. The others stay readable for ever. */
export function ResolveForm({ due, heads, stations, onResolve }: ResolveFormProps) {
  const form = useForm<ResolveTyped, unknown, Resolved>({
    resolver: zodResolver(resolveSchema(due, heads, stations)),
    defaultValues: resolveEmpty,
  });
  const { errors } = form.formState;
  const id = `resolve-${due.slotKey}`;
  const save = form.handleSubmit(({ choice, reason }) => onResolve(due.heads, due.slot, choice, reason));
  const choice = (value: string, words: ReactNode) => (
    <label key={value} className="flex min-h-tap items-center gap-3">
      <input type="radio" value={value} className="h-5 w-5 accent-redlead" {...form.register("choice")} />
      {words}
    </label>
  );
  return (
    <form onSubmit={save} noValidate className="flex flex-col gap-2">
      <fieldset className="grid gap-x-4 sm:grid-cols-2" aria-describedby={errors.choice ? `${id}-choice` : undefined}>
        <legend className="font-bold text-small">What is to stand</legend>
        {heads.map((head, index) =>
          choice(
            head.event,
            <span>
              {letterOf(index)}: <ReadingFigure value={head.value} kind={due.slot.kind} />
            </span>,
          ),
        )}
        {choice("mean", "Their mean")}
        {choice("new", "A new value")}
        {choice("none", "None of them")}
      </fieldset>
      {errors.choice ? (
        <p id={`${id}-choice`} role="alert" className="text-redlead-text text-small">
          {errors.choice.message}
        </p>
      ) : null}
      {form.watch("choice") === "new" ? (
        <ValueFields id={id} kind={entryKind(due.slot, stations)} errors={errors} register={form.register} />
      ) : null}
      <TextField id={`${id}-reason`} label="Reason" error={errors.reason?.message} {...form.register("reason")} />
      <div>
        <Button type="submit" weight="now">
          Settle
        </Button>
      </div>
    </form>
  );
}
