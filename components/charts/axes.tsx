import type { ScaleLinear } from "d3-scale";

export type Scale = ScaleLinear<number, number>;
export type Box = { readonly left: number; readonly right: number; readonly top: number; readonly bottom: number };

/** Moment along the bottom: port on the left, starboard on the right, as the ship lies. */
export function MomentAxis({ scale, box, named, title }: { scale: Scale; box: Box; named: boolean; title?: string }) {
  const count = Math.max(3, Math.floor((box.right - box.left) / 70));
  const shown = scale.tickFormat(count);
  return (
    <g className="text-[11px]">
      {scale.ticks(count).map((tick) => (
        <g key={tick} transform={`translate(${scale(tick)} 0)`}>
          <line
            y1={box.top}
            y2={box.bottom}
            className={tick === 0 ? "stroke-ink-soft" : "stroke-ink-line"}
            strokeWidth={tick === 0 ? 1 : 0.5}
          />
          {named ? (
            <text y={box.bottom + 15} textAnchor="middle" className="fill-ink-soft tabular-nums">
              {shown(tick)}
            </text>
          ) : null}
        </g>
      ))}
      {named ? <Sides box={box} /> : null}
      {title ? (
        <text x={(box.left + box.right) / 2} y={box.bottom + 32} textAnchor="middle" className="fill-ink">
          {title}
        </text>
      ) : null}
    </g>
  );
}

function Sides({ box }: { box: Box }) {
  return (
    <g className="font-bold">
      <text x={box.left} y={box.bottom + 32} className="fill-port">
        P
      </text>
      <text x={box.right} y={box.bottom + 32} textAnchor="end" className="fill-starboard">
        S
      </text>
    </g>
  );
}

export function UprightAxis({ scale, box, title, ticks }: { scale: Scale; box: Box; title: string; ticks: number }) {
  const shown = scale.tickFormat(ticks);
  return (
    <g className="text-[11px]">
      {scale.ticks(ticks).map((tick) => (
        <g key={tick} transform={`translate(0 ${scale(tick)})`}>
          <line
            x1={box.left}
            x2={box.right}
            className={tick === 0 ? "stroke-ink-soft" : "stroke-ink-line"}
            strokeWidth={tick === 0 ? 1 : 0.5}
          />
          <text x={box.left - 6} dy="0.32em" textAnchor="end" className="fill-ink-soft tabular-nums">
            {shown(tick)}
          </text>
        </g>
      ))}
      <text x={4} y={box.top - 9} className="fill-ink">
        {title}
      </text>
    </g>
  );
}
