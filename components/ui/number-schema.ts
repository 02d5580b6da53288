import { z } from "zod";
import { typedNumber } from "./typed-number";

type Limits = { readonly least?: number; readonly most?: number /** said when the number is out of its limits */; readonly sense?: string };

/** A number as a person types it, comma or point; what is not one is refused in a sentence. */
export function numberSchema(limits: Limits = {}) {
  return z.string().transform((typed, context) => {
    const read = typedNumber(typed);
    const wrong = read === null ? notANumber(typed) : outOfSense(read, limits);
    if (wrong === null && read !== null) return read;
    context.addIssue({ code: "custom", message: wrong ?? notANumber(typed) });
    return z.NEVER;
  });
}

/** Several numbers in one line, with spaces or semicolons between them. */
export function numbersSchema(limits: Limits = {}) {
  return z.string().transform((typed, context) => {
    const words = typed.split(/[\s;]+/).filter((word) => word !== "");
    const one = numberSchema(limits);
    const read = (words.length === 0 ? [""] : words).map((word) => one.safeParse(word));
    const wrong = read.find((each) => !each.success);
    if (!wrong) return read.flatMap((each) => (each.success ? [each.data] : []));
    context.addIssue({ code: "custom", message: wrong.error?.issues[0]?.message ?? notANumber(typed) });
    return z.NEVER;
  });
}

function notANumber(typed: string): string {
  return typed.trim() === "" ? "Nothing is typed here yet." : `“${typed.trim()}” is not a number.`;
}

function outOfSense(value: number, { least = Number.NEGATIVE_INFINITY, most = Number.POSITIVE_INFINITY, sense }: Limits): string | null {
  if (value >= least && value <= most) return null;
  return sense ?? `${value} is out of limits: from ${least} to ${most}.`;
}
