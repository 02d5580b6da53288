"use client";

import { zodResolver } from "@hookform/resolvers/zod";
import { useForm } from "react-hook-form";
import { z } from "zod";
import { Button } from "@/components/ui/button";
import { ChoiceField } from "@/components/ui/choice-field";
import { numberSchema } from "@/components/ui/number-schema";
import { QuantityField } from "@/components/ui/quantity-field";
import { TextField } from "@/components/ui/text-field";
import { typedNumber } from "@/components/ui/typed-number";
import { conditionValueSchema } from "@/lib/record/readings-schema";

export type Conditions = z.infer<typeof conditionValueSchema>;

const optional = (typed: string) => (typed.trim() === "" ? undefined : typed.trim());
const schema = z
  .object({
    wind: z.string().transform(optional),
    moorings: z.string().transform(optional),
    underKeel: z.union([z.literal("").transform(() => undefined), numberSchema({ least: 0, most: 200 })]),
    headcount: z
      .string()
      .refine((typed) => typed.trim() === "" || Number.isInteger(typedNumber(typed)), "People are counted in whole numbers.")
      .transform((typed) => typedNumber(typed) ?? undefined),
    bobFree: z.enum(["", "yes", "no"]).transform((typed) => (typed === "" ? undefined : typed === "yes")),
    note: z.string().transform(optional),
  })
  .refine((seen) => Object.values(seen).some((each) => each !== undefined), { path: ["note"], message: "Nothing is typed here yet." });

const empty = { wind: "", moorings: "", underKeel: "", headcount: "", bobFree: "", note: "" } as const;

/** Wind, moorings, water under the keel, people aboard: what can bend the line, noted at the move it belongs to. */
export function ConditionsForm({ move, onSeen }: { move: number; onSeen: (seen: Conditions) => Promise<void> }) {
  const form = useForm<z.input<typeof schema>, unknown, z.output<typeof schema>>({ resolver: zodResolver(schema), defaultValues: empty });
  const { errors } = form.formState;
  const save = form.handleSubmit(async (seen) => {
    await onSeen(withoutGaps(seen));
    form.reset(empty);
  });
  return (
    <form onSubmit={save} noValidate aria-label={`Conditions at move ${move}`} className="grid gap-3 sm:grid-cols-2">
      <TextField id="wind" label="Wind" hint="Force and where from" {...form.register("wind")} />
      <TextField id="moorings" label="Moorings" hint="Slack, or which line is taut" {...form.register("moorings")} />
      <QuantityField id="under-keel" label="Under the keel" unit="m" error={errors.underKeel?.message} {...form.register("underKeel")} />
      <QuantityField id="headcount" label="People aboard" unit="" error={errors.headcount?.message} {...form.register("headcount")} />
      <ChoiceField id="bob-free" label="Bobs hang free" {...form.register("bobFree")}>
        <option value="">Not looked at</option>
        <option value="yes">Yes</option>
        <option value="no">No, one touches</option>
      </ChoiceField>
      <TextField id="condition-note" label="Note" error={errors.note?.message} {...form.register("note")} />
      <div className="sm:col-span-2">
        <Button type="submit">Save conditions</Button>
      </div>
    </form>
  );
}

// an event's body has no place for what was not looked at
function withoutGaps(seen: Conditions): Conditions {
  return conditionValueSchema.parse(Object.fromEntries(Object.entries(seen).filter(([, value]) => value !== undefined)));
}
