import { Panel } from "@/components/ui/panel";
import { Sign } from "@/components/ui/sign";
import type { LiveSnapshot } from "@/lib/sync/live";
import { type Decision, decisionsOwed } from "./decisions-owed";
import { Disagreement } from "./disagreement";
import { GapOfPhone } from "./gap-of-phone";
import { HeldBack } from "./held-back";
import type { LeadActs } from "./lead-acts";

type DecisionsProps = { snapshot: LiveSnapshot; acts: LeadActs | null };

/** What needs the lead's decision, before anything else; where nothing does, one quiet line. */
export function Decisions({ snapshot, acts }: DecisionsProps) {
  const owed = decisionsOwed(snapshot);
  if (owed.length === 0) {
    return (
      <p className="flex items-center gap-2 text-ink-soft">
        <Sign kind="read" />
        Nothing waits for a decision.
      </p>
    );
  }
  return (
    <Panel title="Needs your decision" aside={`${owed.length} open`} className="border-2 border-redlead">
      <ul className="flex flex-col gap-4">
        {owed.map((decision) => (
          <li key={keyOf(decision)} className="border-ink-line border-b pb-4 last:border-b-0 last:pb-0">
            <p className="flex items-center gap-2 font-bold text-large">
              <Sign kind={decision.kind === "disagreement" ? "disagrees" : "alert"} className="h-5 w-5" />
              {decision.sentence}
            </p>
            <Settling decision={decision} snapshot={snapshot} acts={acts} />
          </li>
        ))}
      </ul>
    </Panel>
  );
}

function Settling({ decision, snapshot, acts }: { decision: Decision; snapshot: LiveSnapshot; acts: LeadActs | null }) {
  switch (decision.kind) {
    case "disagreement":
      return <Disagreement due={decision.due} record={snapshot.record} acts={acts} />;
    case "move":
      return <p className="mt-1">Agree who orders; then open or close the move once more from here.</p>;
    case "quarantined":
      return <HeldBack held={decision.held} acts={acts} />;
    case "missing":
      return <GapOfPhone phone={decision.phone} acts={acts} />;
  }
}

function keyOf(decision: Decision): string {
  switch (decision.kind) {
    case "disagreement":
      return decision.due.slotKey;
    case "move":
      return `move ${decision.move.no}`;
    case "quarantined":
      return `held ${decision.held.serverSeq}`;
    case "missing":
      return `phone ${decision.phone.device}`;
  }
}
