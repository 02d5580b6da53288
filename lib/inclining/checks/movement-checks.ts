import { mean } from "@/lib/numerics/sum";
import type { MomentTangentLine } from "../inclined-ship";
import { lackOfFit } from "../lack-of-fit";
import { readingUncertaintyOf } from "../reading-uncertainty";
import { standardisedResiduals } from "../standardised-residuals";
import { tangentScale } from "../tangent-scale";
import type { IncliningTestData } from "../test-data";
import type { CheckLimits } from "./check-limits";
import { type Finding, metOrAttention } from "./finding";

type Straightness = Extract<Finding, { readonly id: "straightness" }>;

/**
 * Whether the plot is straight: the move that stands off most, and the lack of fit. IMO gives no number; this is a statistical
 * test, at 95 % by the usual limits. Scatter below the readings' own uncertainty is not taken for bent.
 */
export function straightness(test: IncliningTestData, line: MomentTangentLine, { straightness: probability }: CheckLimits): Straightness {
  const floor = uncertaintyOfMove(test, line);
  const { points, limit } = standardisedResiduals(line.moves, floor, probability);
  const off = points.flatMap(({ no, standardised }) => (standardised === null ? [] : [{ no, standardised }]));
  const [worst] = off.sort((a, b) => Math.abs(b.standardised) - Math.abs(a.standardised));
  const lack = lackOfFit(line.moves, floor);
  const isStraight = worst !== undefined && limit !== null && Math.abs(worst.standardised) <= limit;
  return {
    id: "straightness",
    verdict: metOrAttention(isStraight && (lack === null || lack.probability >= probability)),
    found: { standardised: worst?.standardised ?? null, move: worst?.no ?? null, probability: lack?.probability ?? null },
    limit: { standardised: limit, probability },
  };
}

/** Weight movements that count: eight, or six where the plot is straight after them. Movements of all sessions together. */
export function movements({ moves }: MomentTangentLine, isStraight: boolean, { movements: { full, straight } }: CheckLimits): Finding {
  const made = moves.filter(({ no }) => no !== 0).length;
  const isMet = made >= full || (made >= straight && isStraight);
  const verdict = isMet ? "met" : made >= straight ? "attention" : "not-met";
  return { id: "movements", verdict, found: { movements: made }, limit: { full, straight } };
}

/** Standard uncertainty that the readings alone give the mean of one move [tangent]; of inclinometers near upright. */
export function uncertaintyOfMove(test: IncliningTestData, { stations }: MomentTangentLine): number {
  const reading = readingUncertaintyOf(test.uncertainty);
  const read = test.stations.filter(({ id }) => stations.some((each) => each.id === id));
  const variances = read.flatMap((station) => {
    const scale = tangentScale(station, 1, { shown: 0, tanHeel: 0 }, reading);
    return scale.ok ? [scale.value(0).uncertainty ** 2] : [];
  });
  return variances.length === 0 ? 0 : Math.sqrt(mean(variances) / variances.length);
}
