import { Sign } from "@/components/ui/sign";
import type { ReadingDue } from "@/lib/sync/live";
import { cellSigns, standing } from "./cell-signs";
import { ReadingFigure } from "./reading-figure";

/** One reading due: its value and its state, in a sign and a word. */
export function SlotCell({ due, isOpen }: { due: ReadingDue; isOpen: boolean }) {
  return (
    <div className={`flex min-h-tap flex-col justify-center gap-0.5 rounded-sm px-2 py-1 ${lookOf(due, isOpen)}`}>
      {standing(due).map((reading) => (
        <ReadingFigure key={reading.event} value={reading.value} kind={due.slot.kind} />
      ))}
      <span className="flex flex-wrap gap-x-2 text-small">
        {cellSigns(due, isOpen).map(({ sign, word }) => (
          <span key={word} className="inline-flex items-center gap-1">
            <Sign kind={sign} className="h-3 w-3" />
            {word}
          </span>
        ))}
      </span>
    </div>
  );
}

function lookOf(due: ReadingDue, isOpen: boolean): string {
  if (due.state === "disagrees") return "border-2 border-redlead bg-redlead-wash";
  if (due.state === "empty") return isOpen ? "border-2 border-ink border-dashed" : "text-ink-soft";
  return "bg-sailcloth-sunken";
}
