import { Quantity } from "@/components/ui/quantity";
import { restingPoint } from "@/lib/inclining/resting-point";
import type { ReadingValue } from "@/lib/sync/event";
import type { SlotKind } from "@/lib/sync/slot";

/** What was read, as it was called out: a swing as its resting point, a U-tube leg by leg. */
export function ReadingFigure({ value, kind }: { value: ReadingValue; kind: SlotKind }) {
  if ("valuesMm" in value) return <Quantity value={rest(value.mode, value.valuesMm)} unit="mm" decimals={1} />;
  if ("valuesDegrees" in value) return <Quantity value={rest(value.mode, value.valuesDegrees)} unit="°" decimals={3} />;
  if ("portMm" in value) return <Legs port={rest(value.mode, value.portMm)} starboard={rest(value.mode, value.starboardMm)} />;
  if ("density" in value) return <Quantity value={value.density} unit="t/m³" decimals={4} />;
  if ("value" in value) return <Quantity value={value.value} unit="m" decimals={3} />;
  if ("length" in value) return <Quantity value={value.length} unit="m" decimals={3} />;
  if ("place" in value) return <PlaceFigure place={value.place} />;
  if ("text" in value) return <span>{value.text}</span>;
  return <span>{kind === "condition" ? conditionInWords(value) : "–"}</span>;
}

function Legs({ port, starboard }: { port: number | null; starboard: number | null }) {
  return (
    <span className="whitespace-nowrap">
      P <Quantity value={port} unit="" decimals={1} /> S <Quantity value={starboard} unit="mm" decimals={1} />
    </span>
  );
}

export function PlaceFigure({ place }: { place: readonly number[] }) {
  return (
    <span className="whitespace-nowrap">
      {["x", "y", "z"].map((axis, index) => (
        <span key={axis} className="mr-2">
          {axis} <Quantity value={place[index] ?? null} unit={index === 2 ? "m" : ""} decimals={3} signed={axis === "y"} />
        </span>
      ))}
    </span>
  );
}

type Conditions = { wind?: string; underKeel?: number; moorings?: string; headcount?: number; bobFree?: boolean; note?: string };

export function conditionInWords(seen: Conditions): string {
  const parts = [
    seen.wind ? `wind ${seen.wind}` : null,
    seen.moorings ? `moorings ${seen.moorings}` : null,
    seen.underKeel === undefined ? null : `${seen.underKeel} m under the keel`,
    seen.headcount === undefined ? null : `${seen.headcount} aboard`,
    seen.bobFree === undefined ? null : seen.bobFree ? "bobs free" : "a bob touches",
    seen.note ?? null,
  ];
  return parts.filter((part) => part !== null).join(", ");
}

function rest(mode: "settled" | "turning-points", values: readonly number[]): number | null {
  const point = restingPoint(mode, values);
  return point.ok ? point.value.value : null;
}
