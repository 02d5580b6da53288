"use client";

import { useMemo } from "react";
import { MomentTangentPlot } from "@/components/charts/moment-tangent-plot";
import { PlotTable } from "@/components/charts/plot-table";
import { Disclosure } from "@/components/ui/disclosure";
import { Panel } from "@/components/ui/panel";
import type { TestRecord } from "@/lib/record/test-record";
import { type LineSoFar, lineSoFar } from "./line-so-far";
import { RefusalSentences } from "./refusal-sentences";

/** Whether the line is straight, as far as the test has gone. */
export function LinePanel({ record }: { record: TestRecord }) {
  const so = useMemo(() => lineSoFar(record), [record]);
  return (
    <Panel title="Moment and tangent" aside={so.ok ? countedInWords(so.value) : "no line yet"}>
      {so.ok ? <Line so={so.value} /> : <RefusalSentences refusal={so.refusal} />}
    </Panel>
  );
}

function Line({ so }: { so: LineSoFar }) {
  return (
    <>
      <MomentTangentPlot points={so.points} line={{ slope: so.line.slope * 1000 }} stations={so.stations} />
      <Disclosure title="The points as figures">
        <PlotTable points={so.points} />
      </Disclosure>
    </>
  );
}

function countedInWords({ line, points }: LineSoFar): string {
  const out = points.filter((point) => point.leftOut !== null).length;
  const moves = `${line.moves.length} moves in the line`;
  return out === 0 ? moves : `${moves}, ${out} ${out === 1 ? "point" : "points"} left out`;
}
