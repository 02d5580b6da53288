import { Facts } from "@/components/ui/facts";
import { Panel } from "@/components/ui/panel";
import { Quantity } from "@/components/ui/quantity";
import type { MomentTangentLine } from "@/lib/inclining/inclined-ship";
import type { TestSoFar } from "@/lib/inclining/test-so-far";
import { inclinedUncertainty } from "@/lib/lightship/inclined-uncertainty";
import type { TestRecord } from "@/lib/record/test-record";
import { inclinedDigits, type ShipDigits } from "@/lib/report/result-digits";
import type { MoveProgress } from "@/lib/sync/live";
import { RefusalSentences } from "./refusal-sentences";
import { runsInWords } from "./runs-in-words";

type StandingResultProps = {
  record: TestRecord;
  so: TestSoFar;
  moves: readonly MoveProgress[] /** moves in the line whose weights stand where the plan put them */;
  unmeasured: readonly number[];
};

/** GM and KG as they stand, how much they rest on, and what is missing: always preliminary. */
export function StandingResult({ record, so, moves, unmeasured }: StandingResultProps) {
  const { asInclined, gmFluid, line } = so;
  const digits = digitsSoFar(record, so);
  return (
    <Panel title="As it stands" aside={<strong className="text-redlead-text">Preliminary, not for loading or sailing</strong>}>
      <div className="grid grid-cols-2 gap-4">
        <Headline name="GM fluid" value={gmFluid} relative={line} of={gmFluid ?? 0} decimals={digits.gm} />
        <Headline
          name="KG, as inclined"
          value={asInclined?.vcg ?? null}
          relative={line}
          of={asInclined?.gmFluid ?? 0}
          decimals={digits.vcg}
        />
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
      {asInclined ? <Rest asInclined={asInclined} digits={digits} /> : null}
      {so.missing.length > 0 ? (
        <div className="mt-3">
          <p className="font-bold">Still missing</p>
          <RefusalSentences refusals={so.missing} />
        </div>
      ) : null}
    </Panel>
  );
}

type HeadlineProps = { name: string; value: number | null; relative: MomentTangentLine | null; of: number; decimals: number };

/** KG is KM less GM: what the line leaves open in the one stands in the other. */
function Headline({ name, value, relative, of, decimals }: HeadlineProps) {
  const spread = relative?.spread ?? null;
  return (
    <div>
      <p className="text-ink-soft text-small">{name}</p>
      <p className="font-bold text-figure">
        <Quantity value={value} unit="m" decimals={decimals} />
      </p>
      {spread && value !== null ? (
        <p className="text-small">
          ± <Quantity value={of * spread.halfWidth95} unit="m" decimals={decimals} /> (95 %)
        </p>
      ) : null}
    </div>
  );
}

/** The digits of the whole reduction; centimetres while fewer than three moves leave the line's uncertainty unknown. */
function digitsSoFar(record: TestRecord, { afloat, line, gmFluid }: TestSoFar): ShipDigits {
  if (!afloat || !line?.spread || gmFluid === null) return { displacement: 1, gm: 2, vcg: 2, lcg: 2, tcg: 2 };
  return inclinedDigits(inclinedUncertainty(record, afloat, line, gmFluid));
}

function Rest({ asInclined, digits }: { asInclined: NonNullable<TestSoFar["asInclined"]>; digits: ShipDigits }) {
  return (
    <Facts
      facts={[
        ["Displacement", <Quantity key="displacement" value={asInclined.displacement} unit="t" decimals={digits.displacement} />],
        ["Free surface", <Quantity key="surface" value={asInclined.freeSurfaceCorrection} unit="m" decimals={digits.gm} />],
        ["GM solid", <Quantity key="solid" value={asInclined.gmSolid} unit="m" decimals={digits.gm} />],
        ["LCG", <Quantity key="lcg" value={asInclined.lcg} unit="m" decimals={digits.lcg} />],
        ["TCG, to starboard +", <Quantity key="tcg" value={asInclined.tcg} unit="m" decimals={digits.tcg} signed />],
      ]}
    />
  );
}
