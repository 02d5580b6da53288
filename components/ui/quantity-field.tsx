import type { InputHTMLAttributes } from "react";
import { controlClass, describedBy, Field } from "./field";

type QuantityFieldProps = InputHTMLAttributes<HTMLInputElement> & {
  id: string;
  label: string;
  unit: string;
  error?: string | undefined;
  hint?: string;
};

/** The one way in for a number: keeps the text as typed, comma or point, with its unit beside it. */
export function QuantityField({ id, label, unit, error, hint, className = "", ...rest }: QuantityFieldProps) {
  return (
    <Field id={id} label={label} error={error} hint={hint}>
      <span className="flex items-center gap-2">
        <input
          id={id}
          inputMode="text"
          autoComplete="off"
          spellCheck={false}
          className={`${controlClass} text-large tabular-nums ${className}`}
          {...describedBy(id, error, hint)}
          {...rest}
        />
        <span className="shrink-0 text-ink-soft text-small">{unit}</span>
      </span>
    </Field>
  );
}
