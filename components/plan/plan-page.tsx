import { Notice } from "@/components/ui/notice";
import { Panel } from "@/components/ui/panel";
import { expectedMoves } from "@/lib/inclining/expected-moves";
import { planCautions } from "@/lib/inclining/plan-cautions";
import type { TestRecord } from "@/lib/record/test-record";
import { planCautionSentence } from "@/lib/report/plan-caution-words";
import { refusalSentence } from "@/lib/report/refusal-sentence";
import { ExpectedForm } from "./expected-form";
import { MovesExpected } from "./moves-expected";
import { ShiftCalculator } from "./shift-calculator";
import { StationsTable } from "./stations-table";
import { WeightsTable } from "./weights-table";

/** The test as it is planned: what hangs where, what is shifted, and what each move should show before anybody steps aboard. */
export function PlanPage({ record, mayState }: { record: TestRecord; mayState: boolean }) {
  const expected = record.settings?.expected;
  const expectation = expected ? expectedMoves(record, expected) : null;
  const cautions = expectation?.ok ? planCautions(expectation.value) : [];
  const stops = cautions.filter(({ stop }) => stop);
  return (
    <div className="flex flex-col gap-5">
      {stops.length > 0 ? (
        <div role="alert" className="rounded border-4 border-redlead bg-redlead-wash px-5 py-4">
          <p className="font-bold text-title">Not to be carried out so</p>
          <ul className="list-disc pl-5">
            {stops.map((caution) => (
              <li key={planCautionSentence(caution)}>{planCautionSentence(caution)}</li>
            ))}
          </ul>
        </div>
      ) : null}
      <Panel title="What each move should show" aside="Not shown to readers">
        {expectation === null ? (
          <Notice title="Nothing is predicted yet">State below how the ship is expected to float, and each move is predicted here.</Notice>
        ) : expectation.ok ? (
          <MovesExpected expectation={expectation.value} record={record} />
        ) : (
          <Notice tone="refused" title="She can't be predicted so">
            {refusalSentence(expectation.refusal)}
          </Notice>
        )}
        {cautions
          .filter(({ stop }) => !stop)
          .map((caution) => (
            <p key={planCautionSentence(caution)} className="mt-3 border-redlead border-l-4 pl-3">
              {planCautionSentence(caution)}
            </p>
          ))}
      </Panel>
      <div className="grid items-start gap-5 lg:grid-cols-2">
        <Panel title="The ship as she is expected" aside={expected ? "stated for this test" : "not stated"}>
          <ExpectedForm test={record.test.id} expected={expected} mayState={mayState} />
        </Panel>
        <ShiftCalculator
          known={expected && expectation?.ok ? { displacement: expected.displacement, gmFluid: expectation.value.gmFluid } : undefined}
        />
      </div>
      <div className="grid items-start gap-5 lg:grid-cols-2">
        <Panel title="Stations" aside={`${record.stations.length}`}>
          <StationsTable stations={record.stations} />
        </Panel>
        <Panel title="Weights" aside={`${record.weights.length}`}>
          <WeightsTable record={record} />
        </Panel>
      </div>
    </div>
  );
}
