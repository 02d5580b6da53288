import type { CheckId } from "@/lib/inclining/checks/finding";
import type { IncliningResult } from "@/lib/lightship/inclining-result";
import { causeName } from "./cause-words";
import { checkName, verdictWord } from "./check-words";
import { hintName, movesInWords } from "./hint-words";
import { inclinedDigits, lightshipDigits } from "./result-digits";
import type { ResultDocument } from "./result-document";
import { decimalsFor, figure, signedFigure } from "./rounding";
import { afloatRows, changeRows, markRows, type Row } from "./waterline-lines";

/**
 * The result of a test as lines of text for a person, each number with its unit.
 * Digits follow the uncertainty, by `inclinedDigits` and `lightshipDigits`; readings stand in the digits in which they are read.
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

function waterlineLines({ waterline, hydrostatics, asInclined }: IncliningResult): readonly string[] {
  return section("Afloat", [
    ...afloatRows(waterline),
    ["Water density", figure(waterline.density, 4), "t/m³"],
    [`Displacement by ${hydrostatics.source}`, figure(hydrostatics.displacement, inclinedDigits(asInclined.uncertainty).displacement), "t"],
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

function fitLines({ fit, asInclined }: IncliningResult): readonly string[] {
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
        gm === null ? "–" : figure(gm, inclinedDigits(asInclined.uncertainty).gm),
        gm === null ? "" : "m",
      ],
    ),
  ]);
}

function inclinedLines({ asInclined }: IncliningResult): readonly string[] {
  const digits = inclinedDigits(asInclined.uncertainty);
  return section("As inclined", [
    ["Displacement", figure(asInclined.displacement, digits.displacement), "t"],
    ["GM fluid", figure(asInclined.gmFluid, digits.gm), "m"],
    ["Free surface correction", figure(asInclined.freeSurfaceCorrection, digits.gm), "m"],
    ["GM solid", figure(asInclined.gmSolid, digits.gm), "m"],
    ["VCG", figure(asInclined.vcg, digits.vcg), "m"],
    ["LCG", figure(asInclined.lcg, digits.lcg), "m"],
    ["TCG to starboard", signedFigure(asInclined.tcg, digits.tcg), "m"],
  ]);
}

function lightshipLines({ lightship, asInclined }: ResultDocument): readonly string[] {
  const digits = lightshipDigits(lightship, asInclined, lightship.interval95);
  const { displacement, vcg, lcg, vcgGeneralised } = lightship.interval95;
  return section(`Lightship, ${lightship.headline} method, with its 95 % interval`, [
    within("Displacement", lightship.displacement, displacement, "t", digits.displacement),
    within("VCG, classical", lightship.vcg, vcg, "m", digits.vcg),
    ...(vcgGeneralised && lightship.vcgGeneralised !== null
      ? [within("VCG, generalised", lightship.vcgGeneralised, vcgGeneralised, "m", digits.vcg)]
      : []),
    within("LCG", lightship.lcg, lcg, "m", digits.lcg),
    ["TCG to starboard", signedFigure(lightship.tcg, digits.tcg), "m"],
  ]);
}

function within(label: string, value: number, [low, high]: readonly [number, number], unit: string, decimals: number): Row {
  return [label, figure(value, decimals), `${unit}   ${figure(low, decimals)} to ${figure(high, decimals)}`];
}

function budgetLines({ budget }: ResultDocument): readonly string[] {
  return section(
    "What leaves VCG open",
    budget.map(({ input, share }): Row => [causeName(input), figure(100 * share, 0), "%"]),
  );
}

function examinationSections({ checks, hints }: ResultDocument): readonly (readonly string[])[] {
  const findings = checks.map(({ id, verdict, found, limit, source }): Row => {
    const from = id.startsWith("previous-") ? ` (${source})` : "";
    return [checkName(id), verdictWord(verdict), ` ${found}; ${limit}${from}`];
  });
  const told = hints.flatMap(({ cause, moves, evidence }) => [`  ${hintName(cause)}: ${movesInWords(moves)}`, `    ${evidence}`]);
  return [section("Checks", findings), ...(told.length === 0 ? [] : [["What the plot tells", ...told]])];
}

function assumptionLines({ assumptions }: ResultDocument): readonly string[] {
  return ["Taken for granted", ...assumptions.map((sentence) => `  ${sentence}`)];
}

function section(title: string, rows: readonly Row[]): readonly string[] {
  return [title, ...rows.map(([label, value, unit]) => `  ${label.padEnd(34)} ${value.padStart(12)} ${unit}`.trimEnd())];
}
