import type { IncliningResult, RoundResult } from "@/lib/lightship/inclining-result";
import { figure, signedFigure } from "./rounding";

/** Draft, trim, heel and sag of a round, each with its name, unit and digits: those in which marks are read. */
export const roundFigures: readonly {
  readonly key: keyof RoundResult;
  readonly name: string;
  readonly unit: string;
  readonly decimals: number;
  readonly signed: boolean;
}[] = [
  { key: "draftAft", name: "Draft aft", unit: "m", decimals: 3, signed: false },
  { key: "draftMidships", name: "Draft midships", unit: "m", decimals: 3, signed: false },
  { key: "draftForward", name: "Draft forward", unit: "m", decimals: 3, signed: false },
  { key: "trim", name: "Trim by the stern", unit: "m", decimals: 3, signed: true },
  { key: "heelDegrees", name: "Heel to starboard", unit: "°", decimals: 2, signed: true },
  { key: "sag", name: "Sag", unit: "m", decimals: 3, signed: true },
];

type Waterline = IncliningResult["waterline"];
export type Row = readonly [label: string, value: string, unit: string];

/** How the ship floats by the marks of the round that counts. */
export function afloatRows(waterline: Waterline): readonly Row[] {
  return roundFigures.map(({ key, name, unit, decimals, signed }) => [
    key === "sag" && !waterline.sagFitted ? "Sag, the marks can't tell it" : name,
    signed ? signedFigure(waterline[key], decimals) : figure(waterline[key], decimals),
    unit,
  ]);
}

/** What each mark and freeboard is off the waterline, and how well it was read. */
export function markRows({ marks }: Waterline): readonly Row[] {
  return marks.map(({ mark, kind, value, estimates, scatter, residual }) => [
    kind === "draft" ? `Mark ${mark}` : `Freeboard ${mark}`,
    signedFigure(1000 * residual, 1),
    `mm   read ${figure(value, 3)} m, ${estimatesInWords(estimates, scatter)}`,
  ]);
}

/** What changed until the round after the moves; nothing where there is none. */
export function changeRows({ after, ...before }: Waterline): readonly Row[] {
  if (after === null) return [];
  const shown = roundFigures.map(({ key, name, unit, decimals, signed }): Row => {
    const digits = signed ? signedFigure : figure;
    const gap = unit === "°" ? unit : ` ${unit}`;
    const rounds = `${digits(before[key], decimals)}${gap} before, ${digits(after[key], decimals)}${gap} after`;
    return [name, signedFigure(after[key] - before[key], decimals), `${unit}   ${rounds}`];
  });
  const marks = before.marks.flatMap(({ mark, kind, change }): Row[] =>
    change === null ? [] : [[kind === "draft" ? `Mark ${mark}` : `Freeboard ${mark}`, signedFigure(1000 * change, 1), "mm"]],
  );
  return [...shown, ...marks];
}

/** How often a mark was estimated, and how well the mean of the estimates is known. */
export function estimatesInWords(estimates: number, scatter: number | null): string {
  if (estimates < 2 || scatter === null) return "1 estimate";
  return `${estimates} estimates, mean known to ${figure(1000 * scatter, 1)} mm`;
}
