/**
 * An answer, or a plain refusal with the numbers that caused it.
 *
 * What data can cause is returned, never thrown; only a broken promise between our own functions throws.
 * Each module names its own refusals; `report/refusal-sentence.ts` is the one place that turns them into sentences.
 */
export type Refusal = { readonly type: string; readonly path?: string };

export type Result<T, R extends Refusal = Refusal> = { readonly ok: true; readonly value: T } | { readonly ok: false; readonly refusal: R };

/** A result that holds its value. */
export function answer<T>(value: T): { readonly ok: true; readonly value: T } {
  return { ok: true, value };
}

/** A result that holds why there is no value. */
export function refuse<R extends Refusal>(refusal: R): { readonly ok: false; readonly refusal: R } {
  return { ok: false, refusal };
}

/** The value of a result our own code has already made sure of; a refusal here is a broken promise and throws. */
export function promised<T>(result: Result<T>): T {
  if (result.ok) return result.value;
  throw new Error(`refused where an answer was promised: ${JSON.stringify(result.refusal)}`);
}
