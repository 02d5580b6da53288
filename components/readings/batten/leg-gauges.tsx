import { scaleLinear } from "d3-scale";
import { Side } from "@/components/ui/side";
import { figure } from "@/lib/report/rounding";
import { type BattenEntry, restOf } from "./batten-entry";

type LegGaugesProps = { form: BattenEntry; scale: readonly [number, number] };

/** The two legs of a U-tube as they stand on their sides of the ship, with the levels read so far. */
export function LegGauges({ form, scale }: LegGaugesProps) {
  return (
    <div className="grid grid-cols-2 gap-2">
      <Leg side="port" level={restOf(form, "port")} scale={scale} active={form.leg === "port"} />
      <Leg side="starboard" level={restOf(form, "starboard")} scale={scale} active={form.leg === "starboard"} />
    </div>
  );
}

type LegProps = { side: "port" | "starboard"; level: number | null; scale: readonly [number, number]; active: boolean };

function Leg({ side, level, scale, active }: LegProps) {
  const up = scaleLinear()
    .domain([...scale])
    .range([80, 6])
    .clamp(true);
  return (
    <div className={`flex items-center gap-3 rounded border-2 px-3 py-2 ${active ? "border-ink bg-sailcloth-raised" : "border-ink-line"}`}>
      <svg viewBox="0 0 34 86" className="h-[86px] shrink-0" aria-hidden="true">
        <rect x="14" y="2" width="18" height="82" rx="2" className="fill-batten stroke-batten-edge" />
        {up.ticks(8).map((tick) => (
          <line key={tick} x1="14" x2="20" y1={up(tick)} y2={up(tick)} className="stroke-batten-ink" />
        ))}
        <rect x="3" y="2" width="8" height="82" rx="4" className="fill-sailcloth-sunken stroke-ink-line" />
        {level === null ? null : <rect x="3" y={up(level)} width="8" height={84 - up(level)} rx="3" className="fill-redlead" />}
      </svg>
      <p className="flex min-w-0 flex-col gap-1">
        <Side side={side} />
        <span className="font-bold font-mono text-large">{level === null ? "–" : figure(level, 1)}</span>
        <span className="text-ink-soft text-small">mm</span>
      </p>
    </div>
  );
}
