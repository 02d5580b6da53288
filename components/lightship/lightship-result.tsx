import { Notice } from "@/components/ui/notice";
import { Panel } from "@/components/ui/panel";
import { Quantity, type QuantityProps } from "@/components/ui/quantity";
import type { InclinedShip } from "@/lib/inclining/inclining-test";
import type { Method } from "@/lib/lightship/inclining-result";
import { generalisedVcgOf, type Lightship } from "@/lib/lightship/lightship";
import type { MethodDifference } from "@/lib/lightship/method-difference";
import { methodSentences } from "@/lib/report/method-words";

type LightshipResultProps = { lightship: Lightship; ship: InclinedShip; method: Method; difference: MethodDifference | null };

/** The result, in the size it deserves, with the caution that belongs to it. */
export function LightshipResult({ lightship, ship, method, difference }: LightshipResultProps) {
  const { displacement, lcg, tcg } = lightship;
  const generalised = generalisedVcgOf(lightship, ship);
  const isGeneralised = method === "generalised" && generalised !== null;
  return (
    <Panel title="Result" aside={isGeneralised ? "generalised reduction" : "classical reduction"}>
      <div className="grid grid-cols-2 gap-x-6 gap-y-4 md:grid-cols-4">
        <Headline name="Displacement" value={displacement} unit="t" decimals={1} />
        <Headline
          name="VCG above baseline"
          value={isGeneralised ? generalised : lightship.vcg}
          unit="m"
          {...digitsOfVcg(lightship, ship)}
        />
        <Headline name="LCG forward of AP" value={lcg} unit="m" decimals={2} />
        <Headline name="TCG to starboard +" value={tcg} unit="m" decimals={3} signed />
      </div>
      {generalised === null ? null : (
        <p className="mt-4">
          By the {isGeneralised ? "classical" : "generalised"} reduction the VCG is{" "}
          <strong>
            <Quantity value={isGeneralised ? lightship.vcg : generalised} unit="m" {...digitsOfVcg(lightship, ship)} />
          </strong>
          . {difference ? methodSentences(difference).join(" ") : null}
        </p>
      )}
      <div className="mt-4">
        <Notice tone="caution">
          Preliminary until approved by the Administration or the class society; not for loading or sailing decisions. Local codes come
          first.
        </Notice>
      </div>
    </Panel>
  );
}

function Headline({ name, ...quantity }: { name: string } & QuantityProps) {
  return (
    <div>
      <p className="text-ink-soft text-small">{name}</p>
      <p className="whitespace-nowrap font-bold text-title sm:text-figure">
        <Quantity {...quantity} />
      </p>
    </div>
  );
}

/** What the line leaves open in KG stands in the lightship's VCG, enlarged as the deductions leave less mass; no draft mark keeps less than a millimetre. */
function digitsOfVcg({ displacement }: Lightship, { line, asInclined }: InclinedShip) {
  const enlarged = asInclined.displacement / displacement;
  if (line.spread === null) return { decimals: 2 };
  const ofLine = (enlarged * asInclined.gmFluid * line.spread.slopeUncertainty) / line.slope;
  return { uncertainty: Math.max(ofLine, 0.01) };
}
