"use client";

import { zodResolver } from "@hookform/resolvers/zod";
import { useEffect } from "react";
import { useForm } from "react-hook-form";
import { Button } from "@/components/ui/button";
import { ChoiceField } from "@/components/ui/choice-field";
import { QuantityField } from "@/components/ui/quantity-field";
import { TextField } from "@/components/ui/text-field";
import type { Entry } from "../task/reading-flow";
import { type Conditions, type ConditionsForm, conditionsFormSchema } from "./conditions-form";

/** A few fields, each of which may stay empty; words need the system's keyboard, numbers do not mind it. */
export function ConditionsScreen({ entry }: { entry: Entry<ConditionsForm> }) {
  const { register, handleSubmit, formState, watch } = useForm<ConditionsForm, unknown, Conditions>({
    resolver: zodResolver(conditionsFormSchema),
    defaultValues: entry.form,
  });
  const { errors } = formState;
  const type = entry.type;
  useEffect(() => {
    const watching = watch((typed) => type(typed as ConditionsForm));
    return () => watching.unsubscribe();
  }, [watch, type]);
  return (
    <form onSubmit={handleSubmit((seen) => entry.save(seen))} noValidate className="flex flex-1 flex-col gap-3">
      <TextField id="wind" label="Wind" placeholder="W 3, gusts" error={errors.wind?.message} {...register("wind")} />
      <TextField id="moorings" label="Moorings" placeholder="all slack" error={errors.moorings?.message} {...register("moorings")} />
      <div className="grid grid-cols-2 gap-3">
        <QuantityField id="under-keel" label="Under the keel" unit="m" error={errors.underKeel?.message} {...register("underKeel")} />
        <QuantityField id="headcount" label="People aboard" unit="" error={errors.headcount?.message} {...register("headcount")} />
      </div>
      <ChoiceField id="bob-free" label="Bobs" error={errors.bobFree?.message} {...register("bobFree")}>
        <option value="">Not looked at</option>
        <option value="yes">Free of everything</option>
        <option value="no">Touching something</option>
      </ChoiceField>
      <TextField id="note" label="Anything else" error={errors.note?.message} {...register("note")} />
      <Button type="submit" weight="now" disabled={entry.saving} className="mt-auto min-h-16 w-full !text-title">
        {entry.saving ? "Saving" : entry.correcting ? "Save correction" : "Save"}
      </Button>
    </form>
  );
}
