import type { ReactNode } from "react";

export type FieldProps = { id: string; label: string; error?: string | undefined; hint?: string | undefined; children: ReactNode };

/** A label above its control, and under it the sentence that says what is wrong. */
export function Field({ id, label, error, hint, children }: FieldProps) {
  return (
    <div className="flex min-w-0 flex-col gap-1">
      <label htmlFor={id} className="font-bold text-small">
        {label}
      </label>
      {children}
      {hint ? (
        <p id={`${id}-hint`} className="text-ink-soft text-small">
          {hint}
        </p>
      ) : null}
      {error ? (
        <p id={`${id}-error`} role="alert" className="border-redlead border-l-4 bg-redlead-wash px-2 py-1 text-redlead-text text-small">
          {error}
        </p>
      ) : null}
    </div>
  );
}

/** What a control tells a screen reader about its hint and its error. */
export function describedBy(id: string, error: string | undefined, hint?: string | undefined) {
  const ids = [hint ? `${id}-hint` : null, error ? `${id}-error` : null].filter((each) => each !== null);
  return { "aria-invalid": error ? true : undefined, "aria-describedby": ids.length > 0 ? ids.join(" ") : undefined };
}

export const controlClass =
  "min-h-tap w-full min-w-0 rounded border-2 border-ink-line bg-sailcloth-raised px-3 text-base text-ink focus:border-ink aria-invalid:border-redlead";
