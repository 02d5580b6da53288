import { Notice } from "@/components/ui/notice";
import type { Hint } from "@/lib/inclining/plot-hints";
import { hintAdvice, hintEvidence, hintName } from "@/lib/report/hint-words";

/** What a plot that is not straight tells: the likely cause, what speaks for it, and the moves to repeat. Nothing while it is straight. */
export function PlotHints({ hints }: { hints: readonly Hint[] }) {
  if (hints.length === 0) return null;
  return (
    <div className="mt-4 flex flex-col gap-3">
      {hints.map((hint) => (
        <Notice key={`${hint.session} ${hint.cause}`} tone="caution" title={`Likely: ${asWithin(hintName(hint.cause))}`}>
          <p>{hintAdvice(hint)}</p>
          <p className="text-ink-soft text-small">{hintEvidence(hint)}.</p>
        </Notice>
      ))}
      {hints.length > 1 ? (
        <p className="text-ink-soft text-small">The moves so far fit each of these; repeating the moves named tells them apart.</p>
      ) : null}
    </div>
  );
}

function asWithin(name: string): string {
  return `${name.charAt(0).toLowerCase()}${name.slice(1)}`;
}
