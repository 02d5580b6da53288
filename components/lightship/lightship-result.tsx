import { Notice } from "@/components/ui/notice";
import { Panel } from "@/components/ui/panel";
import { Quantity, type QuantityProps } from "@/components/ui/quantity";
import type { InclinedShip } from "@/lib/inclining/inclining-test";
import type { Lightship } from "@/lib/lightship/lightship";

/** The result, in the size it deserves, with the caution that belongs to it. */
export function LightshipResult({ lightship, ship }: { lightship: Lightship; ship: InclinedShip }) {
  const { displacement, lcg, tcg, vcg } = lightship;
  return (
    <Panel title="Result" aside="classical reduction">
      <div className="grid grid-cols-2 gap-x-6 gap-y-4 md:grid-cols-4">
        <Headline name="Displacement" value={displacement} unit="t" decimals={1} />
        <Headline name="VCG above baseline" value={vcg} unit="m" {...digitsOfVcg(lightship, ship)} />
        <Headline name="LCG forward of AP" value={lcg} unit="m" decimals={2} />
        <Headline name="TCG to starboard +" value={tcg} unit="m" decimals={3} signed />
      </div>
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
