import type { CheckId } from "@/lib/inclining/checks/finding";
import type { IncliningResult } from "@/lib/lightship/inclining-result";
import { causeName } from "./cause-words";
import { checkName, verdictWord } from "./check-words";
import { hintName, movesInWords } from "./hint-words";
import type { ResultDocument } from "./result-document";
import { decimalsFor, figure, figureWithin, signedFigure } from "./rounding";
import { afloatRows, changeRows, markRows, type Row } from "./waterline-lines";

/**
 * The result of a test as lines of text for a person, each number with its unit.
 * Digits of what follows from the slope follow its 95 % interval; the others are those in which they are read.
 */
export function resultPage(result: ResultDocument): readonly string[] {
  const sections = [
    waterlineLines(result),
    markLines(result),
    ...changeSections(result),
    fitLines(result),
    inclinedLines(result),
    lightshipLines(result),
    budgetLines(result),
    ...examinationSections(result),
  ];
  return [...sections.flatMap((lines) => [...lines, ""]), ...assumptionLines(result)];
}

function waterlineLines({ waterline, hydrostatics }: IncliningResult): readonly string[] {
  return section("Afloat", [
    ...afloatRows(waterline),
    ["Water density", figure(waterline.density, 4), "t/m³"],
    [`Displacement by ${hydrostatics.source}`, figure(hydrostatics.displacement, 1), "t"],
    ["KMt at the measured list", figure(hydrostatics.kmt, 3), "m"],
  ]);
}

function markLines({ waterline, checks }: ResultDocument): readonly string[] {
  return [...section("Marks, measured less fitted", markRows(waterline)), ...foundBy(checks, "mark-agreement")];
}

function changeSections({ waterline, checks }: ResultDocument): readonly (readonly string[])[] {
  const rows = changeRows(waterline);
  if (rows.length === 0) return [];
  return [[...section("After the moves less before", rows), ...foundBy(checks, "drafts-before-after")]];
}

function foundBy(checks: ResultDocument["checks"], id: CheckId): readonly string[] {
  return checks.flatMap((check) => (check.id === id ? [`  ${checkName(id)}: ${verdictWord(check.verdict)}; ${check.found}`] : []));
}

function fitLines({ fit }: IncliningResult): readonly string[] {
  const decimals = decimalsFor(fit.slopeUncertainty * 1e6);
  return section("Line, tangent on moment", [
    ["Slope per 1 000 000 t·m", figure(fit.slope * 1e6, decimals), ""],
    ["Half width at 95 %", figure(fit.halfWidth95 * 100, 2), "% of the slope"],
    ["Degrees of freedom", figure(fit.degreesOfFreedom, 0), ""],
    ["Scatter between moves", figure(fit.betweenMoves * 1000, 2), "mm per m"],
    ["Scatter of stations within a move", fit.withinMoves === null ? "–" : figure(fit.withinMoves * 1000, 2), "mm per m"],
    ...fit.stations.flatMap(({ id, series, slope }): Row[] =>
      slope === null ? [] : [[`Station ${id}, series ${series}, by itself`, figure(slope * 1e6, decimals), ""]],
    ),
    ...fit.moves.map(
      ({ no, moment, gm }): Row => [
        `Move ${no} at ${signedFigure(moment, 2)} t·m, GM`,
        gm === null ? "–" : figure(gm, 3),
        gm === null ? "" : "m",
      ],
    ),
  ]);
}

function inclinedLines({ asInclined, fit }: IncliningResult): readonly string[] {
  const uncertainty = (asInclined.gmFluid * fit.slopeUncertainty) / fit.slope;
  return section("As inclined", [
    ["Displacement", figure(asInclined.displacement, 1), "t"],
    ["GM fluid", figureWithin(asInclined.gmFluid, uncertainty), "m"],
    ["Free surface correction", figureWithin(asInclined.freeSurfaceCorrection, uncertainty), "m"],
    ["GM solid", figureWithin(asInclined.gmSolid, uncertainty), "m"],
    ["VCG", figureWithin(asInclined.vcg, uncertainty), "m"],
    ["LCG", figure(asInclined.lcg, 3), "m"],
    ["TCG to starboard", signedFigure(asInclined.tcg, 3), "m"],
  ]);
}

function lightshipLines({ lightship }: ResultDocument): readonly string[] {
  const { displacement, vcg, lcg, vcgGeneralised } = lightship.interval95;
  return section(`Lightship, ${lightship.headline} method, with its 95 % interval`, [
    within("Displacement", lightship.displacement, displacement, "t"),
    within("VCG, classical", lightship.vcg, vcg, "m"),
    ...(vcgGeneralised && lightship.vcgGeneralised !== null
      ? [within("VCG, generalised", lightship.vcgGeneralised, vcgGeneralised, "m")]
      : []),
    within("LCG", lightship.lcg, lcg, "m"),
    ["TCG to starboard", signedFigure(lightship.tcg, 3), "m"],
  ]);
}

function within(label: string, value: number, [low, high]: readonly [number, number], unit: string): Row {
  const decimals = decimalsFor((high - low) / 4);
  return [label, figure(value, decimals), `${unit}   ${figure(low, decimals)} to ${figure(high, decimals)}`];
}

function budgetLines({ budget }: ResultDocument): readonly string[] {
  return section(
    "What leaves VCG open",
    budget.map(({ input, share }): Row => [causeName(input), figure(100 * share, 0), "%"]),
  );
}

function examinationSections({ checks, hints }: ResultDocument): readonly (readonly string[])[] {
  const findings = checks.map(({ id, verdict, found, limit }): Row => [checkName(id), verdictWord(verdict), ` ${found}; ${limit}`]);
  const told = hints.flatMap(({ cause, moves, evidence }) => [`  ${hintName(cause)}: ${movesInWords(moves)}`, `    ${evidence}`]);
  return [section("Checks", findings), ...(told.length === 0 ? [] : [["What the plot tells", ...told]])];
}

function assumptionLines({ assumptions }: ResultDocument): readonly string[] {
  return ["Taken for granted", ...assumptions.map((sentence) => `  ${sentence}`)];
}

function section(title: string, rows: readonly Row[]): readonly string[] {
  return [title, ...rows.map(([label, value, unit]) => `  ${label.padEnd(34)} ${value.padStart(12)} ${unit}`.trimEnd())];
}
