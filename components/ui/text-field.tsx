import type { InputHTMLAttributes } from "react";
import { controlClass, describedBy, Field } from "./field";

type TextFieldProps = InputHTMLAttributes<HTMLInputElement> & { id: string; label: string; error?: string | undefined; hint?: string };

/** One line of words. */
export function TextField({ id, label, error, hint, className = "", ...rest }: TextFieldProps) {
  return (
    <Field id={id} label={label} error={error} hint={hint}>
      <input id={id} className={`${controlClass} ${className}`} {...describedBy(id, error, hint)} {...rest} />
    </Field>
  );
}
