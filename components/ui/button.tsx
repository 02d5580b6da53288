import type { ButtonHTMLAttributes, ReactNode } from "react";

type Weight = "now" | "plain" | "quiet";

/** `now` is red-lead: the one thing to do next on a screen, at most once. */
const weights: Record<Weight, string> = {
  now: "bg-redlead text-redlead-on font-bold hover:brightness-110 disabled:bg-sailcloth-sunken disabled:text-ink-soft",
  plain: "border-2 border-ink text-ink hover:bg-sailcloth-sunken disabled:border-ink-line disabled:text-ink-soft",
  quiet: "text-ink underline underline-offset-4 decoration-ink-line hover:decoration-ink disabled:text-ink-soft",
};

type ButtonProps = ButtonHTMLAttributes<HTMLButtonElement> & { weight?: Weight; children: ReactNode };

export function Button({ weight = "plain", type = "button", className = "", ...rest }: ButtonProps) {
  return <button type={type} className={`${buttonClass(weight)} ${className}`} {...rest} />;
}

export function buttonClass(weight: Weight): string {
  return `inline-flex min-h-tap items-center justify-center gap-2 rounded px-4 py-2 text-base active:translate-y-px ${weights[weight]}`;
}
