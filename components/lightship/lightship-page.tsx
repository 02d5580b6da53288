"use client";

import { useMemo } from "react";
import { MomentTangentPlot } from "@/components/charts/moment-tangent-plot";
import { PlotTable } from "@/components/charts/plot-table";
import { lineSoFar } from "@/components/control/line-so-far";
import { PlotHints } from "@/components/control/plot-hints";
import { RefusalSentences } from "@/components/control/refusal-sentences";
import { Disclosure } from "@/components/ui/disclosure";
import { Notice } from "@/components/ui/notice";
import { Panel } from "@/components/ui/panel";
import type { Hint } from "@/lib/inclining/plot-hints";
import { methodDifference } from "@/lib/lightship/method-difference";
import type { TestRecord } from "@/lib/record/test-record";
import { inclinedDigits, lightshipDigits } from "@/lib/report/result-digits";
import { BalanceTable } from "./balance-table";
import { ChecksPanel } from "./checks-panel";
import { DefencePanel } from "./defence-panel";
import { FitPanel } from "./fit-panel";
import { HydrostaticsPanel } from "./hydrostatics-panel";
import { ItemsTable } from "./items-table";
import { type FoundLightship, foundLightship } from "./lightship-found";
import { LightshipResult } from "./lightship-result";
import { SettingsPanel } from "./settings-panel";
import { useDefence } from "./use-defence";
import { WaterlinePanel } from "./waterline-panel";

/** From as inclined to lightship, with all that it rests on. */
export function LightshipPage({ record, mayState }: { record: TestRecord; mayState: boolean }) {
  const found = useMemo(() => foundLightship(record), [record]);
  return (
    <div className="flex flex-col gap-5">
      {found.ok ? <Found found={found.value} record={record} /> : <NotYet refusals={found.refusal.faults} />}
      <ItemsTable items={record.items} />
      {mayState ? <SettingsPanel record={record} /> : null}
    </div>
  );
}

function Found({ found, record }: { found: FoundLightship; record: TestRecord }) {
  const { ship, lines, examination, result } = found;
  const defence = useDefence(record);
  const intervals = defence.type === "done" ? defence.defence.interval95 : null;
  const digits = lightshipDigits(result.lightship, result.asInclined, intervals);
  return (
    <>
      <LightshipResult lightship={result.lightship} difference={methodDifference(record, ship)} digits={digits} />
      <DefencePanel record={record} defence={defence} digits={digits} />
      <Panel title="From as inclined to lightship">
        <BalanceTable lines={lines} digits={{ "as-inclined": inclinedDigits(result.asInclined.uncertainty), lightship: digits }} />
      </Panel>
      <div className="grid items-start gap-5 lg:grid-cols-2">
        <WaterlinePanel waterline={result.waterline} water={ship.afloat.water} checks={examination.checks} />
        <HydrostaticsPanel hydrostatics={ship.afloat.hydrostatics} asInclined={result.asInclined} />
        <Plot record={record} hints={examination.hints} />
        <FitPanel test={record} ship={ship} gmDecimals={inclinedDigits(result.asInclined.uncertainty).gm} />
      </div>
      <ChecksPanel checks={examination.checks} />
    </>
  );
}

function Plot({ record, hints }: { record: TestRecord; hints: readonly Hint[] }) {
  const so = useMemo(() => lineSoFar(record), [record]);
  if (!so) return null;
  return (
    <Panel title="Moment and tangent">
      <MomentTangentPlot points={so.points} line={{ slope: so.line.slope * 1000 }} stations={so.stations} />
      <Disclosure title="The points as figures">
        <PlotTable points={so.points} />
      </Disclosure>
      <PlotHints hints={hints} />
    </Panel>
  );
}

function NotYet({ refusals }: { refusals: Parameters<typeof RefusalSentences>[0]["refusals"] }) {
  return (
    <Notice tone="caution" title="The lightship can’t be worked out yet">
      <RefusalSentences refusals={refusals} />
    </Notice>
  );
}
