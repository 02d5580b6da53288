import { Sign } from "@/components/ui/sign";
import type { LiveSnapshot } from "@/lib/sync/live";
import { type MoveNow, moveNow } from "./move-now";

/** The state of the test, readable from two metres: which move, whether it is open, what is still due. */
export function MoveSignal({ snapshot }: { snapshot: LiveSnapshot }) {
  const now = moveNow(snapshot);
  const isOpen = now.kind === "open";
  return (
    <div className="flex flex-wrap items-center gap-x-6 gap-y-2">
      <p className="flex items-baseline gap-3">
        <span className="font-bold text-large">{now.move ? "Move" : "Moves"}</span>
        <strong className="font-mono text-beacon">{now.move ? now.move.no : "–"}</strong>
      </p>
      <div className="min-w-0">
        <p className={`inline-block rounded px-3 py-1 font-bold text-figure ${isOpen ? "bg-ink text-sailcloth" : "border-2 border-ink"}`}>
          {signalWord(now)}
        </p>
        <p className="mt-1 text-ink-soft">{labelOf(now.move)}</p>
        {now.move && now.move.repeat > 1 ? <p className="font-bold">Repeat {now.move.repeat}</p> : null}
      </div>
      {isOpen ? <StillDue now={now} /> : null}
    </div>
  );
}

function StillDue({ now }: { now: MoveNow }) {
  return (
    <div className="min-w-0">
      <p className="font-bold text-figure">
        {now.read} of {now.expected} read
      </p>
      {now.due.length === 0 ? (
        <p className="flex items-center gap-2">
          <Sign kind="read" />
          Every station is in
        </p>
      ) : (
        <p className="flex items-center gap-2">
          <Sign kind="due" />
          Due: {now.due.map(({ slot }) => (slot.kind === "batten" ? slot.station : "")).join(", ")}
        </p>
      )}
    </div>
  );
}

// a label that only repeats the number says nothing twice
function labelOf(move: MoveNow["move"]): string {
  if (!move) return "Every move of the plan is closed.";
  return move.label === `Move ${move.no}` ? "" : move.label;
}

function signalWord({ kind, move }: MoveNow): string {
  if (kind === "done") return "ALL CLOSED";
  if (kind === "open") return "OPEN";
  return move?.no === 0 ? "NOT BEGUN" : "NEXT, NOT OPEN";
}
