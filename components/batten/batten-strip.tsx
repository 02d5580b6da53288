import { ticks } from "d3-array";
import { figure } from "@/lib/report/rounding";

export type BattenMark = { readonly value: number; readonly label: string };

type BattenStripProps = {
  /** what the marks are read in; millimetres on a batten, degrees on an inclinometer */
  unit: "mm" | "°";
  marks: readonly BattenMark[];
  mean: number | null;
  /** this station's own reading at move 0, where the zero stands */
  zero: number | null;
  /** the part of the batten that is shown */
  span: readonly [number, number];
  className?: string;
};

const WIDTH = 360;
const HEIGHT = 124;
const WOOD = { top: 30, height: 48, bottom: 78 };
const EDGE = 16;

/** The batten as it stands below deck, seen from above, port on the left: each mark where it is, the mean and the zero. */
export function BattenStrip({ unit, marks, mean, zero, span, className = "" }: BattenStripProps) {
  const along = placeOnStrip(span);
  return (
    <svg
      viewBox={`0 0 ${WIDTH} ${HEIGHT}`}
      role="img"
      aria-label={inWords(marks, mean, zero, unit)}
      className={`block w-full ${className}`}
    >
      <Wood along={along} span={span} unit={unit} />
      {zero === null || zero < span[0] || zero > span[1] ? null : <Zero x={along(zero)} />}
      {marks.map((mark, order) => (
        <Mark key={mark.label} x={along(mark.value)} label={mark.label} row={order % 3} />
      ))}
      {mean === null ? null : <Mean x={along(mean)} text={`${shown(mean, unit)} ${unit}`} />}
      <text x={2} y={HEIGHT - 4} className="fill-port font-bold text-[14px]">
        P
      </text>
      <text x={WIDTH - 2} y={HEIGHT - 4} textAnchor="end" className="fill-starboard font-bold text-[14px]">
        S
      </text>
    </svg>
  );
}

type Along = (value: number) => number;

// a mark beyond the part shown stands at its end
function placeOnStrip([from, to]: readonly [number, number]): Along {
  return (value) => EDGE + ((WIDTH - 2 * EDGE) * (Math.min(Math.max(value, from), to) - from)) / (to - from);
}

function Wood({ along, span, unit }: { along: Along; span: readonly [number, number]; unit: "mm" | "°" }) {
  const fine = ticks(span[0], span[1], 40);
  const named = ticks(span[0], span[1], 6);
  return (
    <g>
      <rect x={1} y={WOOD.top} width={WIDTH - 2} height={WOOD.height} rx={2} className="fill-batten stroke-batten-edge" />
      {grain.map((line) => (
        <path key={line} d={line} className="fill-none stroke-batten-grain" />
      ))}
      {fine.map((value) => (
        <line
          key={value}
          x1={along(value)}
          x2={along(value)}
          y1={WOOD.bottom - 8}
          y2={WOOD.bottom}
          className="stroke-batten-ink"
          strokeWidth={0.75}
        />
      ))}
      {named.map((value) => (
        <g key={value}>
          <line
            x1={along(value)}
            x2={along(value)}
            y1={WOOD.bottom - 16}
            y2={WOOD.bottom}
            className="stroke-batten-ink"
            strokeWidth={1.5}
          />
          <text x={along(value)} y={WOOD.bottom + 16} textAnchor="middle" className="fill-ink text-[13px]">
            {shown(value, unit)}
          </text>
        </g>
      ))}
    </g>
  );
}

const grain = [
  `M4 40 C 120 36, 220 45, ${WIDTH - 4} 39`,
  `M4 52 C 80 56, 190 47, ${WIDTH - 4} 53`,
  `M4 66 C 90 70, 250 61, ${WIDTH - 4} 67`,
] as const;

// the order of the marks, on three rows so that neighbours stay legible
function Mark({ x, label, row }: { x: number; label: string; row: number }) {
  return (
    <g>
      <line x1={x} x2={x} y1={WOOD.top} y2={WOOD.bottom} className="stroke-batten-ink" strokeWidth={1.5} strokeDasharray="3 2" />
      <text x={x} y={WOOD.top + 12 + 11 * row} dx={3} className="fill-batten-ink font-bold text-[11px]">
        {label}
      </text>
    </g>
  );
}

function Mean({ x, text }: { x: number; text: string }) {
  const anchor = x < 60 ? "start" : x > WIDTH - 60 ? "end" : "middle";
  return (
    <g>
      <path d={`M${x} ${WOOD.top + 3} l-6 -10 h12 Z`} className="fill-redlead" />
      <line x1={x} x2={x} y1={WOOD.top} y2={WOOD.bottom} className="stroke-redlead" strokeWidth={3} />
      <text
        x={anchor === "middle" ? x : anchor === "start" ? 2 : WIDTH - 2}
        y={16}
        textAnchor={anchor}
        className="fill-ink font-bold text-[18px]"
      >
        {text}
      </text>
    </g>
  );
}

function Zero({ x }: { x: number }) {
  const anchor = x < 60 ? "start" : x > WIDTH - 60 ? "end" : "middle";
  const inside = Math.min(WIDTH - 24, Math.max(24, x));
  return (
    <g className="fill-ink">
      <line x1={x} x2={x} y1={WOOD.top} y2={WOOD.bottom} className="stroke-ink" strokeWidth={2} />
      <path d={`M${x} ${WOOD.bottom + 20} l-5 9 h10 Z`} />
      <text
        x={anchor === "middle" ? inside + 9 : inside}
        y={HEIGHT - 4}
        textAnchor={anchor === "middle" ? "start" : anchor}
        className="text-[12px]"
      >
        zero
      </text>
    </g>
  );
}

function inWords(marks: readonly BattenMark[], mean: number | null, zero: number | null, unit: "mm" | "°"): string {
  const read = marks.length === 0 ? "no marks yet" : `marks at ${marks.map((mark) => shown(mark.value, unit)).join(", ")} ${unit}`;
  const at = mean === null ? "" : `, mean ${shown(mean, unit)} ${unit}`;
  return `Batten: ${read}${at}${zero === null ? "" : `, zero at ${shown(zero, unit)} ${unit}`}`;
}

// a tenth of a millimetre is the finest that a pencil mark carries, a thousandth of a degree what an inclinometer shows
function shown(value: number, unit: "mm" | "°"): string {
  return figure(value, unit === "mm" ? 1 : 3).replace(/\.?0+$/, (zeros) => (zeros.startsWith(".") ? "" : zeros));
}
