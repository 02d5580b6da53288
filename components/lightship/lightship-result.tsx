import { Notice } from "@/components/ui/notice";
import { Panel } from "@/components/ui/panel";
import { Quantity, type QuantityProps } from "@/components/ui/quantity";
import type { IncliningResult } from "@/lib/lightship/inclining-result";
import type { MethodDifference } from "@/lib/lightship/method-difference";
import { methodSentences } from "@/lib/report/method-words";
import type { lightshipDigits } from "@/lib/report/result-digits";

type LightshipResultProps = {
  lightship: IncliningResult["lightship"];
  difference: MethodDifference | null;
  digits: ReturnType<typeof lightshipDigits>;
};

/** The result, in the size it deserves, with the caution that belongs to it. */
export function LightshipResult({ lightship, difference, digits }: LightshipResultProps) {
  const { displacement, lcg, tcg, vcg, vcgGeneralised: generalised } = lightship;
  const isGeneralised = lightship.headline === "generalised" && generalised !== null;
  return (
    <Panel title="Result" aside={isGeneralised ? "generalised reduction" : "classical reduction"}>
      <div className="grid grid-cols-2 gap-x-6 gap-y-4 md:grid-cols-4">
        <Headline name="Displacement" value={displacement} unit="t" decimals={digits.displacement} />
        <Headline name="VCG above baseline" value={isGeneralised ? generalised : vcg} unit="m" decimals={digits.vcg} />
        <Headline name="LCG forward of AP" value={lcg} unit="m" decimals={digits.lcg} />
        <Headline name="TCG to starboard +" value={tcg} unit="m" decimals={digits.tcg} signed />
      </div>
      {generalised === null ? null : (
        <p className="mt-4">
          By the {isGeneralised ? "classical" : "generalised"} reduction the VCG is{" "}
          <strong>
            <Quantity value={isGeneralised ? vcg : generalised} unit="m" decimals={digits.vcg} />
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
