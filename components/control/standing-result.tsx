import { Facts } from "@/components/ui/facts";
import { Panel } from "@/components/ui/panel";
import { Quantity } from "@/components/ui/quantity";
import type { MomentTangentLine } from "@/lib/inclining/inclined-ship";
import type { TestSoFar } from "@/lib/inclining/test-so-far";
import type { MoveProgress } from "@/lib/sync/live";
import { RefusalSentences } from "./refusal-sentences";
import { runsInWords } from "./runs-in-words";

type StandingResultProps = {
  so: TestSoFar;
  moves: readonly MoveProgress[] /** moves in the line whose weights stand where the plan put them */;
  unmeasured: readonly number[];
};

/** GM and KG as they stand, how much they rest on, and what is missing: always preliminary. */
export function StandingResult({ so, moves, unmeasured }: StandingResultProps) {
  const { asInclined, gmFluid, line } = so;
  return (
    <Panel title="As it stands" aside={<strong className="text-redlead-text">Preliminary, not for loading or sailing</strong>}>
      <div className="grid grid-cols-2 gap-4">
        <Headline name="GM fluid" value={gmFluid} relative={line} of={gmFluid ?? 0} />
        <Headline name="KG, as inclined" value={asInclined?.vcg ?? null} relative={line} of={asInclined?.gmFluid ?? 0} />
      </div>
      <p className="mt-3 mb-2">
        {so.movesUsed} of {moves.length} moves in the line
        {line?.spread ? ", the interval from the scatter of the moves alone." : "; three are needed for an interval."}
      </p>
      {unmeasured.length > 0 ? (
        <p className="mb-2">
          The weights were not measured at {unmeasured.length === 1 ? "move" : "moves"} <strong>{runsInWords(unmeasured)}</strong>: the
          plan’s places are used.
        </p>
      ) : null}
      {asInclined ? <Rest asInclined={asInclined} /> : null}
      {so.missing.length > 0 ? (
        <div className="mt-3">
          <p className="font-bold">Still missing</p>
          <RefusalSentences refusals={so.missing} />
        </div>
      ) : null}
    </Panel>
  );
}

/** KG is KM less GM: what the line leaves open in the one stands in the other. */
function Headline({ name, value, relative, of }: { name: string; value: number | null; relative: MomentTangentLine | null; of: number }) {
  const spread = relative?.spread ?? null;
  const slope = relative?.slope ?? 1;
  return (
    <div>
      <p className="text-ink-soft text-small">{name}</p>
      <p className="font-bold text-figure">
        {spread ? (
          <Quantity value={value} unit="m" uncertainty={withDrafts((of * spread.slopeUncertainty) / slope)} />
        ) : (
          <Quantity value={value} unit="m" decimals={2} />
        )}
      </p>
      {spread && value !== null ? (
        <p className="text-small">
          ± <Quantity value={of * spread.halfWidth95} unit="m" uncertainty={withDrafts(of * spread.halfWidth95)} /> (95 %)
        </p>
      ) : null}
    </div>
  );
}

// the line alone would promise tenths of a millimetre that no draft mark keeps
function withDrafts(uncertainty: number): number {
  return Math.max(uncertainty, 0.01);
}

function Rest({ asInclined }: { asInclined: NonNullable<TestSoFar["asInclined"]> }) {
  return (
    <Facts
      facts={[
        ["Displacement", <Quantity key="displacement" value={asInclined.displacement} unit="t" decimals={1} />],
        ["Free surface", <Quantity key="surface" value={asInclined.freeSurfaceCorrection} unit="m" decimals={3} />],
        ["GM solid", <Quantity key="solid" value={asInclined.gmSolid} unit="m" decimals={3} />],
        ["LCG", <Quantity key="lcg" value={asInclined.lcg} unit="m" decimals={2} />],
        ["TCG, to starboard +", <Quantity key="tcg" value={asInclined.tcg} unit="m" decimals={3} signed />],
      ]}
    />
  );
}
