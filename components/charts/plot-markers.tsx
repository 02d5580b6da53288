import type { KeyboardEvent } from "react";
import type { Scale } from "./axes";
import { type PlotPoint, pointName } from "./plot-points";
import { StationShape } from "./station-shape";

const ASIDE = 9;

type PlotMarkersProps = {
  points: readonly PlotPoint[];
  stations: readonly string[];
  x: Scale;
  y: Scale;
  of: "tangent" | "residual";
  chosen: number;
  /** given where the markers can be walked through; the others only follow */
  onChoose?: (index: number) => void;
};

/** The markers of one plot; the chosen one carries a ring, and one stop of the tab key serves them all. */
export function PlotMarkers({ points, stations, x, y, of, chosen, onChoose }: PlotMarkersProps) {
  return points.map((point, index) => {
    return (
      <g
        key={`${point.station} ${point.move} ${point.tangent}`}
        data-point={`${point.station} ${point.move} ${of}`}
        transform={`translate(${x(point.moment) + asideBy(point, stations, of)} ${y(point[of])})`}
        className="outline-none"
        {...(onChoose ? walked(points, index, chosen, onChoose) : { "aria-hidden": true })}
      >
        {index === chosen ? <circle r={12} className="fill-none stroke-redlead" strokeWidth={1.5} /> : null}
        <StationShape index={stations.indexOf(point.station)} hollow={point.leftOut !== null} size={of === "tangent" ? 6 : 4} />
        {isBeyond(y, point[of]) ? <path d={point[of] > 0 ? "M0 -13l4 6h-8Z" : "M0 13l4 -6h-8Z"} className="fill-ink" /> : null}
      </g>
    );
  });
}

// residuals of one move stand side by side, or stations that agree would hide each other
function asideBy(point: PlotPoint, stations: readonly string[], of: "tangent" | "residual"): number {
  return of === "residual" ? (stations.indexOf(point.station) - (stations.length - 1) / 2) * ASIDE : 0;
}

function isBeyond(y: Scale, value: number): boolean {
  return y.clamp() && Math.abs(value) > Math.max(...y.domain());
}

function walked(points: readonly PlotPoint[], index: number, chosen: number, onChoose: (index: number) => void) {
  const point = points[index] as PlotPoint;
  return {
    role: "graphics-symbol",
    "aria-label": `${pointName(point)}${point.leftOut ? `, left out: ${point.leftOut}` : ""}`,
    tabIndex: index === Math.min(chosen, points.length - 1) ? 0 : -1,
    onMouseEnter: () => onChoose(index),
    onFocus: () => onChoose(index),
    onKeyDown: (event: KeyboardEvent<SVGGElement>) => step(event, index, points.length, onChoose),
  };
}

function step(event: KeyboardEvent<SVGGElement>, index: number, count: number, onChoose: (index: number) => void) {
  const by = event.key === "ArrowRight" ? 1 : event.key === "ArrowLeft" ? -1 : 0;
  const to = index + by;
  if (by === 0 || to < 0 || to >= count) return;
  event.preventDefault();
  onChoose(to);
  const marker = event.currentTarget.parentElement?.querySelectorAll<SVGGElement>("g[role=graphics-symbol]")[to];
  marker?.focus();
}
