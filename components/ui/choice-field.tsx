import type { ReactNode, SelectHTMLAttributes } from "react";
import { controlClass, describedBy, Field } from "./field";

type ChoiceFieldProps = SelectHTMLAttributes<HTMLSelectElement> & {
  id: string;
  label: string;
  error?: string | undefined;
  hint?: string;
  children: ReactNode;
};

/** One of a few, by name. */
export function ChoiceField({ id, label, error, hint, className = "", children, ...rest }: ChoiceFieldProps) {
  return (
    <Field id={id} label={label} error={error} hint={hint}>
      <select id={id} className={`${controlClass} ${className}`} {...describedBy(id, error, hint)} {...rest}>
        {children}
      </select>
    </Field>
  );
}
