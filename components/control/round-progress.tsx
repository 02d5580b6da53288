import { Disclosure } from "@/components/ui/disclosure";
import { Panel } from "@/components/ui/panel";
import type { ReadingDue } from "@/lib/sync/live";
import type { SlotKind } from "@/lib/sync/slot";
import { SlotCell } from "./slot-cell";
import { slotInWords } from "./slot-in-words";

const rounds: readonly { title: string; kinds: readonly SlotKind[] }[] = [
  { title: "Draft marks", kinds: ["draft"] },
  { title: "Freeboards", kinds: ["freeboard"] },
  { title: "Soundings", kinds: ["sounding", "ballast"] },
  { title: "Water", kinds: ["water"] },
];

/** What is read before and after the moves, and how far that has come. */
export function RoundProgress({ due }: { due: readonly ReadingDue[] }) {
  const shown = rounds
    .map((round) => ({ ...round, due: due.filter((each) => round.kinds.includes(each.slot.kind)) }))
    .filter((round) => round.due.length > 0);
  return (
    <Panel title="Drafts, soundings, water">
      {shown.length === 0 ? <p>The plan asks for none.</p> : null}
      {shown.map((round) => (
        <Round key={round.title} title={round.title} due={round.due} />
      ))}
    </Panel>
  );
}

function Round({ title, due }: { title: string; due: readonly ReadingDue[] }) {
  const read = due.filter((each) => each.state !== "empty").length;
  const disagree = due.filter((each) => each.state === "disagrees").length;
  return (
    <div className="border-ink-line border-b last:border-b-0">
      <Disclosure title={`${title}: ${read} of ${due.length} read${disagree > 0 ? `, ${disagree} disagree` : ""}`} open={disagree > 0}>
        <ul className="grid gap-2 pb-3 sm:grid-cols-2">
          {due.map((each) => (
            <li key={each.slotKey}>
              <p className="font-bold text-small first-letter:uppercase">{slotInWords(each.slot)}</p>
              <SlotCell due={each} isOpen />
            </li>
          ))}
        </ul>
      </Disclosure>
    </div>
  );
}
