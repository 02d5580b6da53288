"use client";

import { extent } from "d3-array";
import { scaleLinear } from "d3-scale";
import { useState } from "react";
import { type Box, MomentAxis, type Scale, UprightAxis } from "./axes";
import { PlotMarkers } from "./plot-markers";
import { alongTheLine, type PlotLine, type PlotPoint } from "./plot-points";
import { PlotReadout } from "./plot-readout";
import { StationKey } from "./station-key";
import { useWidth } from "./use-width";

type MomentTangentPlotProps = { points: readonly PlotPoint[]; line: PlotLine | null; stations: readonly string[] };

const UPPER = { top: 24, height: 230 };
const LOWER = { top: 306, height: 84 };
const HEIGHT = 430;
/** mm per m; finer than any batten is read */
const FINEST = 0.05;
const MARGIN = { left: 46, right: 14 };

/**
 * Moment against tangent: every resting point by its station's shape, the common line, and under it
 * what is left when the line is taken away, magnified. Points that take no part are hollow.
 */
export function MomentTangentPlot({ points, line, stations }: MomentTangentPlotProps) {
  const [ref, width] = useWidth(620);
  const [chosen, setChosen] = useState(0);
  const ordered = alongTheLine(points);
  const x = momentScale(points, width);
  const upper = boxOf(UPPER, width);
  const lower = boxOf(LOWER, width);
  const tangent = scaleOver(
    points.map((point) => point.tangent),
    upper,
  );
  const residual = residualScale(points, lower);
  return (
    <figure className="min-w-0">
      <div ref={ref}>
        <svg
          viewBox={`0 0 ${width} ${HEIGHT}`}
          className="block w-full"
          aria-label="Moment and tangent, point by point; arrow keys walk along the line"
        >
          <MomentAxis scale={x} box={upper} named={false} />
          <UprightAxis scale={tangent} box={upper} title="Tangent of heel, mm per m" ticks={6} />
          {line ? <CommonLine line={line} x={x} y={tangent} /> : null}
          <PlotMarkers points={ordered} stations={stations} x={x} y={tangent} of="tangent" chosen={chosen} onChoose={setChosen} />
          <MomentAxis scale={x} box={lower} named title="Moment, t·m" />
          <UprightAxis scale={residual} box={lower} title="Left over, mm per m; stations side by side" ticks={3} />
          <PlotMarkers points={ordered} stations={stations} x={x} y={residual} of="residual" chosen={chosen} />
        </svg>
      </div>
      <figcaption className="mt-2 flex flex-col gap-1">
        <StationKey stations={stations} anyHollow={points.some((point) => point.leftOut !== null)} />
        <PlotReadout point={ordered[chosen] ?? null} />
      </figcaption>
    </figure>
  );
}

function CommonLine({ line, x, y }: { line: PlotLine; x: Scale; y: Scale }) {
  const [from = 0, to = 0] = x.domain();
  return (
    <line
      data-testid="common-line"
      x1={x(from)}
      y1={y(line.slope * from)}
      x2={x(to)}
      y2={y(line.slope * to)}
      className="stroke-redlead"
      strokeWidth={2}
    />
  );
}

function boxOf(place: { top: number; height: number }, width: number): Box {
  return { left: MARGIN.left, right: width - MARGIN.right, top: place.top, bottom: place.top + place.height };
}

function momentScale(points: readonly PlotPoint[], width: number): Scale {
  const [least = -1, most = 1] = extent(points, (point) => point.moment);
  const reach = Math.max(Math.abs(least ?? 0), Math.abs(most ?? 0)) || 1;
  return scaleLinear()
    .domain([-1.08 * reach, 1.08 * reach])
    .range([MARGIN.left, width - MARGIN.right]);
}

// by the points that count: one that is left out must not flatten the others
function residualScale(points: readonly PlotPoint[], box: Box): Scale {
  const counted = points.filter((point) => point.leftOut === null).map((point) => point.residual);
  return scaleOver([...counted, FINEST], box).clamp(true);
}

function scaleOver(values: readonly number[], box: Box): Scale {
  const reach = Math.max(...values.map(Math.abs), 0) || 1;
  return scaleLinear()
    .domain([-1.15 * reach, 1.15 * reach])
    .range([box.bottom, box.top]);
}
