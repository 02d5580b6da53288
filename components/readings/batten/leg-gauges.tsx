"use client";

import { ticks } from "d3-array";
import { Side } from "@/components/ui/side";
import { figure } from "@/lib/report/rounding";
import { type BattenEntry, type Leg, restOf } from "./batten-entry";

type LegGaugesProps = { form: BattenEntry; scale: readonly [number, number]; onLeg: (leg: Leg) => void };

/** The two legs of a U-tube as they stand on their sides of the ship; a tap sends the pad's digits to that leg. */
export function LegGauges({ form, scale, onLeg }: LegGaugesProps) {
  return (
    <fieldset className="grid grid-cols-2 gap-2">
      <legend className="sr-only">Leg of the U-tube</legend>
      {(["port", "starboard"] as const).map((side) => (
        <LegGauge key={side} side={side} level={restOf(form, side)} scale={scale} active={form.leg === side} onChoose={() => onLeg(side)} />
      ))}
    </fieldset>
  );
}

type LegGaugeProps = {
  side: "port" | "starboard";
  level: number | null;
  scale: readonly [number, number];
  active: boolean;
  onChoose: () => void;
};

function LegGauge({ side, level, scale, active, onChoose }: LegGaugeProps) {
  return (
    <button
      type="button"
      aria-pressed={active}
      onClick={onChoose}
      className={`flex items-center gap-3 rounded border-2 px-3 py-2 text-left ${side === "starboard" ? "flex-row-reverse text-right" : ""} ${active ? "border-ink bg-sailcloth-raised" : "border-ink-line"}`}
    >
      <Gauge level={level} scale={scale} />
      <span className="flex min-w-0 flex-1 flex-col gap-1">
        <span className="text-small">
          <Side side={side} /> leg
        </span>
        <span className="font-bold text-title">{level === null ? "–" : figure(level, 1)}</span>
        <span className="text-ink-soft text-small">{active ? "typing here" : "mm"}</span>
      </span>
    </button>
  );
}

function Gauge({ level, scale }: { level: number | null; scale: readonly [number, number] }) {
  const [least, most] = scale;
  const up = (value: number) => 96 - (90 * (Math.min(Math.max(value, least), most) - least)) / (most - least);
  return (
    <svg viewBox="0 0 38 102" className="h-[102px] shrink-0" aria-hidden="true">
      <rect x="16" y="2" width="20" height="98" rx="2" className="fill-batten stroke-batten-edge" />
      {ticks(least, most, 10).map((tick) => (
        <line key={tick} x1="16" x2="23" y1={up(tick)} y2={up(tick)} className="stroke-batten-ink" />
      ))}
      <rect x="3" y="2" width="10" height="98" rx="5" className="fill-sailcloth-sunken stroke-ink-soft" />
      {level === null ? null : <rect x="4" y={up(level)} width="8" height={99 - up(level)} rx="3" className="fill-ink-soft" />}
      {level === null ? null : <line x1="1" x2="36" y1={up(level)} y2={up(level)} className="stroke-redlead" strokeWidth="2.5" />}
    </svg>
  );
}
