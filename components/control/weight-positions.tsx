"use client";

import { Disclosure } from "@/components/ui/disclosure";
import { Panel } from "@/components/ui/panel";
import type { LiveSnapshot, MoveProgress } from "@/lib/sync/live";
import type { LeadActs } from "./lead-acts";
import { PositionAgain } from "./position-again";
import { type Measured, PositionsForm } from "./positions-form";
import { SlotCell } from "./slot-cell";

type WeightPositionsProps = { move: MoveProgress; snapshot: LiveSnapshot; acts: LeadActs };

/** Where each weight stands at a move: those not measured yet first, those measured folded away. */
export function WeightPositions({ move, snapshot, acts }: WeightPositionsProps) {
  const slots = snapshot.due.filter(({ slot }) => slot.kind === "position" && slot.move === move.no);
  const unmeasured = slots.filter((slot) => slot.state === "empty");
  const measured = slots.filter((slot) => slot.state !== "empty");
  const save = async (rows: readonly Measured[]) => {
    for (const { weight, place } of rows) await acts.record({ kind: "position", weight, move: move.no }, { place }, "station");
  };
  return (
    <Panel
      title="Where the weights stand"
      aside={`Move ${move.no}: ${unmeasured.length === 0 ? "all measured" : `${unmeasured.length} of ${slots.length} not measured`}`}
    >
      {unmeasured.length > 0 ? (
        <PositionsForm
          key={unmeasured.map((slot) => slot.slotKey).join(" ")}
          move={move.no}
          planned={snapshot.record.moves.find((each) => each.no === move.no)?.positions ?? {}}
          due={unmeasured}
          onMeasured={save}
        />
      ) : null}
      {measured.map((each) => (
        <Disclosure key={each.slotKey} title={each.slot.kind === "position" ? `${each.slot.weight} measured` : "Measured"}>
          <SlotCell due={each} isOpen={false} />
          <PositionAgain due={each} acts={acts} />
        </Disclosure>
      ))}
      {slots.length === 0 ? <p>The plan asks for no positions at this move.</p> : null}
    </Panel>
  );
}
