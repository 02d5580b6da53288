import { z } from "zod";
import { numberSchema } from "@/components/ui/number-schema";
import { typedNumber } from "@/components/ui/typed-number";
import { conditionValueSchema } from "@/lib/record/readings-schema";

export type Conditions = z.infer<typeof conditionValueSchema>;
const optional = (typed: string) => (typed.trim() === "" ? undefined : typed.trim());

/** The form's texts on their way to the one schema of a condition; an empty field is left out, not kept empty. */
export const conditionsFormSchema = z
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
  .transform((seen) => Object.fromEntries(Object.entries(seen).filter(([, value]) => value !== undefined)))
  .pipe(conditionValueSchema)
  .refine((seen) => Object.keys(seen).length > 0, { message: "Write down at least one thing you see.", path: ["note"] });

export type ConditionsForm = z.input<typeof conditionsFormSchema>;
