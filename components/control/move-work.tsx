"use client";

import { Disclosure } from "@/components/ui/disclosure";
import { Panel } from "@/components/ui/panel";
import type { LiveSnapshot, MoveProgress, ReadingDue } from "@/lib/sync/live";
import { ConditionsForm } from "./conditions-form";
import type { LeadActs } from "./lead-acts";
import { moveNow } from "./move-now";
import { type Measured, PositionsForm } from "./positions-form";
import { RadioForm } from "./radio-form";
import { SlotCell } from "./slot-cell";
import { slotInWords } from "./slot-in-words";

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
      {current ? <Weights key={current.no} move={current} snapshot={snapshot} acts={acts} /> : null}
      {current ? (
        <Panel title="Conditions" aside={`Move ${current.no}`}>
          <ConditionsForm move={current.no} onSeen={(seen) => acts.record({ kind: "condition", move: current.no }, seen, "station")} />
        </Panel>
      ) : null}
    </>
  );
}

function Weights({ move, snapshot, acts }: { move: MoveProgress } & MoveWorkProps) {
  const slots = snapshot.due.filter(({ slot }) => slot.kind === "position" && slot.move === move.no);
  const unmeasured = slots.filter((slot) => slot.state === "empty");
  const save = async (measured: readonly Measured[]) => {
    for (const { weight, place } of measured) await acts.record({ kind: "position", weight, move: move.no }, { place }, "station");
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
      {slots.length > unmeasured.length ? <Measurements slots={slots.filter((slot) => slot.state !== "empty")} /> : null}
      {slots.length === 0 ? <p>The plan asks for no positions at this move.</p> : null}
    </Panel>
  );
}

function Measurements({ slots }: { slots: readonly ReadingDue[] }) {
  return (
    <Disclosure title={`${slots.length} measured`}>
      <ul className="flex flex-col gap-2">
        {slots.map((each) => (
          <li key={each.slotKey}>
            <p className="font-bold text-small first-letter:uppercase">{slotInWords(each.slot)}</p>
            <SlotCell due={each} isOpen={false} />
          </li>
        ))}
      </ul>
    </Disclosure>
  );
}

function lastClosed(moves: readonly MoveProgress[]): MoveProgress | null {
  return moves.filter((move) => move.state === "closed").at(-1) ?? moves[0] ?? null;
}
