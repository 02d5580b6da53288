"use client";

import { useMemo } from "react";
import { MomentTangentPlot } from "@/components/charts/moment-tangent-plot";
import { PlotTable } from "@/components/charts/plot-table";
import { Disclosure } from "@/components/ui/disclosure";
import { Panel } from "@/components/ui/panel";
import { uncertaintyOfMove } from "@/lib/inclining/checks/movement-checks";
import { plotHints } from "@/lib/inclining/plot-hints";
import type { TestSoFar } from "@/lib/inclining/test-so-far";
import type { TestRecord } from "@/lib/record/test-record";
import { type LineSoFar, lineSoFar } from "./line-so-far";
import { PlotHints } from "./plot-hints";

/** Whether the line is straight, as far as the test has gone. */
export function LinePanel({ record, so }: { record: TestRecord; so: TestSoFar }) {
  const line = useMemo(() => lineSoFar(record, so), [record, so]);
  const hints = useMemo(() => (so.line ? plotHints(so.line, uncertaintyOfMove(record, so.line)) : []), [record, so]);
  return (
    <Panel title="Moment and tangent" aside={line ? countedInWords(line) : "no line yet"}>
      {line ? <Line so={line} /> : <p>The line begins when two moves with different moments have been read.</p>}
      <PlotHints hints={hints} />
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
