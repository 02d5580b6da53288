import { z } from "zod";
import { numberSchema } from "@/components/ui/number-schema";
import { type CheckLimits, usualLimits } from "@/lib/inclining/checks/check-limits";
import { settingsSchema, type TestSettings } from "@/lib/record/settings-schema";
import { shortFigure } from "@/lib/report/rounding";
import { type AgreementLimits, usualAgreement } from "@/lib/sync/agreement";
import { type LimitField, limitFields } from "./limit-fields";

/** What a test chooses: only what differs from the usual. */
export type Chosen = Pick<TestSettings, "method" | "weights" | "agreement" | "limits">;
export type SettingsTyped = {
  method: NonNullable<Chosen["method"]>;
  weights: NonNullable<Chosen["weights"]>;
  limits: Record<string, string>;
};

type Standing = { limits: CheckLimits; agreement: AgreementLimits };
const usual: Standing = { limits: usualLimits, agreement: usualAgreement };

/** What stands in the fields: what the test sets, else the usual. */
export function typedSettings(settings: Chosen | undefined): SettingsTyped {
  const standing = { limits: { ...usualLimits, ...settings?.limits }, agreement: settings?.agreement ?? usualAgreement };
  return {
    method: settings?.method ?? "classical",
    weights: settings?.weights ?? "equal",
    limits: Object.fromEntries(limitFields.map((field) => [field.name, figureOf(standing, field)])),
  };
}

/** The usual value of a limit, as it would stand in its field. */
export function usualFigure(field: LimitField): string {
  return figureOf(usual, field);
}

const amount = numberSchema({ least: 0, sense: "A limit is 0 or more." });

/** The form's schema: what is typed becomes what differs from the usual; the record's own schema says what may stand in it. */
export const typedSettingsSchema = z
  .object({
    method: z.enum(["classical", "generalised"]),
    weights: z.enum(["equal", "readings"]),
    limits: z.object(Object.fromEntries(limitFields.map(({ name }) => [name, amount]))),
  })
  .transform(({ method, weights, limits }, context): Chosen => {
    const standing = standingFrom(limits);
    const refused = settingsSchema.safeParse(standing).error?.issues ?? [];
    for (const issue of refused) context.addIssue({ code: "custom", path: ["limits", fieldAt(issue.path)], message: sentenceOf(issue) });
    if (refused.length > 0) return z.NEVER;
    return {
      ...(method === "classical" ? {} : { method }),
      ...(weights === "equal" ? {} : { weights }),
      ...differing(standing),
    };
  });

function figureOf(standing: Standing, { at, per }: LimitField): string {
  const value = at.reduce<unknown>((within, key) => Reflect.get(Object(within), key), standing);
  return shortFigure(Number(value) * per);
}

function standingFrom(typed: Record<string, number>): Standing {
  const standing: Standing = structuredClone(usual);
  for (const { name, at, per } of limitFields) {
    const holder = at.slice(0, -1).reduce<unknown>((within, key) => Reflect.get(Object(within), key), standing);
    // 4.1 % by division is 0.040999999999999995 in binary
    Reflect.set(Object(holder), at.at(-1) ?? "", Number(shortFigure((typed[name] ?? 0) / per, 12)));
  }
  return standing;
}

function differing({ limits, agreement }: Standing): Chosen {
  const isOther = (key: keyof CheckLimits) => JSON.stringify(limits[key]) !== JSON.stringify(usualLimits[key]);
  const keys = (Object.keys(usualLimits) as (keyof CheckLimits)[]).filter(isOther);
  const own = settingsSchema.shape.limits.parse(Object.fromEntries(keys.map((key) => [key, limits[key]])));
  return {
    ...(keys.length > 0 ? { limits: own } : {}),
    ...(JSON.stringify(agreement) === JSON.stringify(usualAgreement) ? {} : { agreement }),
  };
}

// what a pair of limits refuses stands at the upper one
function fieldAt(path: readonly PropertyKey[]): string {
  return limitFields.findLast(({ at }) => path.every((key, i) => at[i] === key))?.name ?? "";
}

function sentenceOf(issue: z.core.$ZodIssue): string {
  switch (issue.code) {
    case "too_small":
      return issue.inclusive ? `At least ${issue.minimum} is needed.` : `More than ${issue.minimum} is needed.`;
    case "too_big":
      return "That is too much for a limit.";
    case "invalid_type":
      return "A whole number is needed.";
    default:
      return "The lower limit must lie below the upper one.";
  }
}
