"use client";

import { Panel } from "@/components/ui/panel";
import type { LiveSnapshot, MoveProgress } from "@/lib/sync/live";
import { ConditionsForm } from "./conditions-form";
import type { LeadActs } from "./lead-acts";
import { moveNow } from "./move-now";
import { RadioForm } from "./radio-form";
import { WeightPositions } from "./weight-positions";

type MoveWorkProps = { snapshot: LiveSnapshot; acts: LeadActs };

/** What the wheelhouse writes down itself: values called over the radio, where the weights stand, the conditions. */
export function MoveWork({ snapshot, acts }: MoveWorkProps) {
  const { kind, move, due } = moveNow(snapshot);
  const current = kind === "open" ? move : lastClosed(snapshot.moves);
  return (
    <>
      <Panel title="By radio">
        <RadioForm
          due={snapshot.due}
          stations={snapshot.record.stations}
          first={kind === "open" ? (due[0]?.slotKey ?? null) : null}
          onRecord={({ slot, value }) => acts.record(slot, value, "radio")}
        />
      </Panel>
      {current ? <WeightPositions key={current.no} move={current} snapshot={snapshot} acts={acts} /> : null}
      {current ? (
        <Panel title="Conditions" aside={`Move ${current.no}`}>
          <ConditionsForm move={current.no} onSeen={(seen) => acts.record({ kind: "condition", move: current.no }, seen, "station")} />
        </Panel>
      ) : null}
    </>
  );
}

function lastClosed(moves: readonly MoveProgress[]): MoveProgress | null {
  return moves.filter((move) => move.state === "closed").at(-1) ?? moves[0] ?? null;
}
