"use client";

import { zodResolver } from "@hookform/resolvers/zod";
import { useForm } from "react-hook-form";
import { Button } from "@/components/ui/button";
import { Notice } from "@/components/ui/notice";
import { QuantityField } from "@/components/ui/quantity-field";
import type { StatedUncertainty } from "@/lib/lightship/stated-uncertainty";
import { typedUncertainty, type UncertaintyTyped, uncertaintyFields, uncertaintySchema } from "./uncertainty-typed";
import { useSavePart } from "./use-save-part";

type UncertaintyFormProps = { test: string; stated: Partial<StatedUncertainty> | undefined };

/** The standard uncertainties behind the intervals: stated for this test, or the program's own assumptions. */
export function UncertaintyForm({ test, stated }: UncertaintyFormProps) {
  const { save, refused } = useSavePart<StatedUncertainty>(test, "uncertainty");
  const form = useForm<UncertaintyTyped, unknown, StatedUncertainty>({
    resolver: zodResolver(uncertaintySchema),
    values: typedUncertainty(stated),
  });
  const { errors, isSubmitting } = form.formState;
  return (
    <form onSubmit={form.handleSubmit(save)} noValidate className="flex flex-col gap-4">
      <p className="max-w-prose text-small">
        Standard uncertainties: about two times of three the truth lies within one of them.{" "}
        {stated === undefined ? "These are the program’s own assumptions; save them to state them for this test." : null}
      </p>
      <div className="grid gap-x-6 gap-y-3 sm:grid-cols-2 lg:grid-cols-3">
        {uncertaintyFields.map(({ key, label, unit }) => (
          <QuantityField key={key} id={`u-${key}`} label={label} unit={unit} error={errors[key]?.message} {...form.register(key)} />
        ))}
      </div>
      {refused ? <Notice tone="refused">{refused}</Notice> : null}
      <div className="flex flex-wrap gap-3">
        <Button type="submit" weight="now" disabled={isSubmitting}>
          State them for this test
        </Button>
        {stated === undefined ? null : <Button onClick={() => save(null)}>Back to the assumptions</Button>}
      </div>
    </form>
  );
}
