import { ticks } from "d3-array";
import { scaleLinear } from "d3-scale";

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
const HEIGHT = 92;
const WOOD = { top: 30, height: 34 };

/** The batten as it stands below deck, seen from above, port on the left: each mark where it is, the mean and the zero. */
export function BattenStrip({ unit, marks, mean, zero, span, className = "" }: BattenStripProps) {
  const along = scaleLinear()
    .domain([...span])
    .range([14, WIDTH - 14])
    .clamp(true);
  return (
    <svg
      viewBox={`0 0 ${WIDTH} ${HEIGHT}`}
      role="img"
      aria-label={inWords(marks, mean, zero, unit)}
      className={`block w-full ${className}`}
    >
      <Wood along={along} span={span} />
      {zero === null ? null : <Zero x={along(zero)} />}
      {marks.map((mark) => (
        <Mark key={mark.label} x={along(mark.value)} label={mark.label} />
      ))}
      {mean === null ? null : <Mean x={along(mean)} text={`${shown(mean)} ${unit}`} />}
      <text x={14} y={88} className="fill-port font-bold text-[11px]">
        P
      </text>
      <text x={WIDTH - 14} y={88} textAnchor="end" className="fill-starboard font-bold text-[11px]">
        S
      </text>
    </svg>
  );
}

type Along = (value: number) => number;

function Wood({ along, span }: { along: Along; span: readonly [number, number] }) {
  const fine = ticks(span[0], span[1], 40);
  const named = ticks(span[0], span[1], 6);
  const bottom = WOOD.top + WOOD.height;
  return (
    <g>
      <rect x={2} y={WOOD.top} width={WIDTH - 4} height={WOOD.height} rx={2} className="fill-batten stroke-batten-edge" />
      <path
        d={`M4 ${WOOD.top + 11} C 120 ${WOOD.top + 8}, 220 ${WOOD.top + 15}, ${WIDTH - 4} ${WOOD.top + 10}`}
        className="fill-none stroke-batten-grain"
      />
      <path
        d={`M4 ${WOOD.top + 24} C 90 ${WOOD.top + 27}, 250 ${WOOD.top + 20}, ${WIDTH - 4} ${WOOD.top + 25}`}
        className="fill-none stroke-batten-grain"
      />
      {fine.map((value) => (
        <line
          key={value}
          x1={along(value)}
          x2={along(value)}
          y1={bottom - 6}
          y2={bottom}
          className="stroke-batten-ink"
          strokeWidth={0.75}
        />
      ))}
      {named.map((value) => (
        <g key={value}>
          <line x1={along(value)} x2={along(value)} y1={bottom - 12} y2={bottom} className="stroke-batten-ink" strokeWidth={1.25} />
          <text x={along(value)} y={bottom + 13} textAnchor="middle" className="fill-ink-soft font-mono text-[10px]">
            {shown(value)}
          </text>
        </g>
      ))}
    </g>
  );
}

function Mark({ x, label }: { x: number; label: string }) {
  return (
    <g>
      <line x1={x} x2={x} y1={WOOD.top} y2={WOOD.top + WOOD.height} className="stroke-batten-ink" strokeWidth={1.5} strokeDasharray="3 2" />
      <text x={x} y={WOOD.top + 10} dx={3} className="fill-batten-ink font-mono text-[9px]">
        {label}
      </text>
    </g>
  );
}

function Mean({ x, text }: { x: number; text: string }) {
  const anchor = x < 60 ? "start" : x > WIDTH - 60 ? "end" : "middle";
  return (
    <g>
      <path d={`M${x} ${WOOD.top + 2} l-6 -11 h12 Z`} className="fill-redlead" />
      <line x1={x} x2={x} y1={WOOD.top} y2={WOOD.top + WOOD.height} className="stroke-redlead" strokeWidth={2.5} />
      <text x={x} y={14} textAnchor={anchor} className="fill-ink font-bold font-mono text-[14px]">
        {text}
      </text>
    </g>
  );
}

function Zero({ x }: { x: number }) {
  return <path d={`M${x} ${WOOD.top + WOOD.height + 2} l-4 8 h8 Z`} className="fill-ink" aria-label="zero" />;
}

function inWords(marks: readonly BattenMark[], mean: number | null, zero: number | null, unit: string): string {
  const read = marks.length === 0 ? "no marks yet" : `marks at ${marks.map((mark) => shown(mark.value)).join(", ")} ${unit}`;
  const at = mean === null ? "" : `, mean ${shown(mean)} ${unit}`;
  return `Batten: ${read}${at}${zero === null ? "" : `, zero at ${shown(zero)} ${unit}`}`;
}

// a tenth of a millimetre is the finest that a pencil mark carries
function shown(value: number): string {
  return String(Math.round(value * 10) / 10).replace("-", "−");
}
