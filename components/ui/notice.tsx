import type { ReactNode } from "react";

type Tone = "caution" | "plain" | "refused";
const tones: Record<Tone, string> = {
  caution: "border-redlead bg-redlead-wash",
  refused: "border-redlead bg-redlead-wash text-redlead-text",
  plain: "border-ink-line bg-sailcloth-sunken",
};

/** A sentence that must not be missed: a caution, a refusal, or what to do in an empty place. */
export function Notice({ tone = "plain", title, children }: { tone?: Tone; title?: string; children: ReactNode }) {
  return (
    <div role={tone === "refused" ? "alert" : undefined} className={`rounded border-l-4 px-4 py-3 ${tones[tone]}`}>
      {title ? <p className="font-bold">{title}</p> : null}
      <div>{children}</div>
    </div>
  );
}
