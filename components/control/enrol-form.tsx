"use client";

import { zodResolver } from "@hookform/resolvers/zod";
import { useState } from "react";
import { useForm } from "react-hook-form";
import { z } from "zod";
import { Button } from "@/components/ui/button";
import { ChoiceField } from "@/components/ui/choice-field";
import { Notice } from "@/components/ui/notice";
import { TextField } from "@/components/ui/text-field";
import { Enrolment, type MadeCode } from "./enrolment";

const schema = z.object({
  personName: z.string().trim().min(1, "Write who will read with this phone.").max(80, "A name of at most 80 letters."),
  role: z.enum(["reader", "lead", "engineer", "witness"]),
});
export type NewPhone = z.infer<typeof schema>;
type EnrolFormProps = { onMake: (phone: NewPhone) => Promise<MadeCode | { refused: string }> };

/** Makes a code that lets one phone in. */
export function EnrolForm({ onMake }: EnrolFormProps) {
  const [made, setMade] = useState<MadeCode | null>(null);
  const [refused, setRefused] = useState<string | null>(null);
  const form = useForm<NewPhone>({ resolver: zodResolver(schema), defaultValues: { personName: "", role: "reader" } });
  const make = form.handleSubmit(async (phone) => {
    const answer = await onMake(phone);
    setRefused("refused" in answer ? answer.refused : null);
    setMade("refused" in answer ? null : answer);
    if (!("refused" in answer)) form.reset();
  });
  return (
    <div className="flex flex-col gap-4">
      <form onSubmit={make} noValidate className="flex flex-wrap items-end gap-3">
        <div className="min-w-52 flex-1">
          <TextField
            id="enrol-name"
            label="Person who reads"
            autoComplete="off"
            error={form.formState.errors.personName?.message}
            {...form.register("personName")}
          />
        </div>
        <ChoiceField id="enrol-role" label="As" {...form.register("role")}>
          <option value="reader">Reader</option>
          <option value="lead">Lead</option>
          <option value="witness">Witness</option>
          <option value="engineer">Engineer</option>
        </ChoiceField>
        <Button type="submit" disabled={form.formState.isSubmitting}>
          Make a code
        </Button>
      </form>
      {refused ? <Notice tone="refused">{refused}</Notice> : null}
      {made ? <Enrolment made={made} /> : null}
    </div>
  );
}
