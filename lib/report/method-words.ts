import type { MethodDifference } from "@/lib/lightship/method-difference";
import { figure, signedFigure } from "./rounding";

/** Half a millimetre is below what any test can show; from three on an edge in the water is felt. */
const nothing = 0.0005;
const felt = 0.003;

/** Why the generalised KG differs from the classical one, in sentences. */
export function methodSentences({ found, byWallSides, edges }: MethodDifference): readonly string[] {
  const millimetres = (metres: number) => `${signedFigure(1000 * metres, 1)} mm`;
  const rest = found - byWallSides;
  const told = `Generalised less classical, as inclined: ${millimetres(found)}. Upright sides alone explain ${millimetres(byWallSides)}: a straight line through a curve that steepens with heel shows too much GM.`;
  const isExplained = Math.abs(rest) < Math.max(nothing, 0.3 * Math.abs(byWallSides));
  if (edges.length > 0) return [told, `${edgeWords(edges)}${Math.abs(rest) < felt ? isNotFelt : isFelt}`];
  if (isExplained) return [told];
  return [told, `The other ${millimetres(rest)} come from sides that are not upright at the waterline.`];
}

const isFelt = ": the classical line is not valid there; trust the generalised result.";
const isNotFelt = ", too short a stretch of it for the line to show.";

function edgeWords(edges: MethodDifference["edges"]): string {
  const first = edges.reduce((least, edge) => (Math.abs(edge.tanHeel) < Math.abs(least.tanHeel) ? edge : least));
  const kinds = [...new Set(edges.map(({ kind }) => (kind === "knuckle" ? "a knuckle" : "the deck edge")))].join(" and ");
  const degrees = figure((Math.atan(Math.abs(first.tanHeel)) * 180) / Math.PI, 1);
  return `Within the heels of the test ${kinds} met the water (from ${degrees}° to ${first.side}, ${figure(first.x, 1)} m forward of AP)`;
}
