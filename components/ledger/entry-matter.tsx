import { ReadingFigure } from "@/components/control/reading-figure";
import { slotInWords } from "@/components/control/slot-in-words";
import { Disclosure } from "@/components/ui/disclosure";
import { readingValueSchema } from "@/lib/sync/event";
import { slotSchema } from "@/lib/sync/slot";
import type { EntryLine } from "./ledger-table";

/** What an entry says: a reading as a reading, a plain change in a line, everything else as it is written, folded away. */
export function EntryMatter({ entry: { before, after, reason } }: { entry: EntryLine }) {
  return (
    <div className="flex flex-col gap-1">
      <Matter before={before} after={after} />
      {reason ? <p className="text-small">“{reason}”</p> : null}
    </div>
  );
}

function Matter({ before, after }: Pick<EntryLine, "before" | "after">) {
  const slot = slotSchema.safeParse(partOf(after, "slot"));
  const value = readingValueSchema.safeParse(partOf(after, "value"));
  if (slot.success) {
    const was = readingValueSchema.safeParse(partOf(Array.isArray(before) ? before[0] : null, "value"));
    return (
      <p>
        {slotInWords(slot.data)}
        {was.success ? (
          <>
            : <ReadingFigure value={was.data} kind={slot.data.kind} /> →
          </>
        ) : value.success ? (
          ":"
        ) : null}{" "}
        {value.success ? <ReadingFigure value={value.data} kind={slot.data.kind} /> : null}
      </p>
    );
  }
  const move = partOf(partOf(after, "value"), "move");
  if (typeof move === "number") return <p>{moveInWords(move, partOf(partOf(after, "value"), "repeat"))}</p>;
  const message = partOf(after, "message");
  if (typeof message === "string") return <p>{message}</p>;
  if (typeof after === "string") return <p>{typeof before === "string" ? `${before} → ${after}` : after}</p>;
  return before === null && after === null ? null : <AsWritten before={before} after={after} />;
}

function moveInWords(move: number, repeat: unknown): string {
  return typeof repeat === "number" && repeat > 1 ? `move ${move}, repeat ${repeat}` : `move ${move}`;
}

function AsWritten({ before, after }: Pick<EntryLine, "before" | "after">) {
  return (
    <Disclosure title="As it is written">
      <pre className="max-h-80 max-w-xl overflow-auto rounded bg-sailcloth-sunken p-2 font-mono text-small">
        {JSON.stringify(before === null ? after : { before, after }, null, 1)}
      </pre>
    </Disclosure>
  );
}

function partOf(matter: unknown, key: string): unknown {
  return typeof matter === "object" && matter !== null && key in matter ? (matter as Record<string, unknown>)[key] : undefined;
}
