import type { BattenValue } from "@/lib/inclining/test-readings";
import { figure } from "@/lib/report/rounding";
import { restOfValue, restOn } from "./earlier-rests";

/** A batten reading in one line: where the bob rested, and of how many turning points. */
export function battenInWords(value: BattenValue): string {
  if ("portMm" in value) return `P ${level(value.mode, value.portMm)} S ${level(value.mode, value.starboardMm)} mm`;
  const rest = restOfValue(value);
  const unit = "valuesDegrees" in value ? "°" : "mm";
  if (rest === null) return "no resting point";
  const count = "valuesDegrees" in value ? value.valuesDegrees.length : value.valuesMm.length;
  const of = value.mode === "turning-points" ? `, ${count} turning points` : "";
  return `${figure(rest, unit === "°" ? 3 : 1)} ${unit}${of}`;
}

function level(mode: BattenValue["mode"], values: readonly number[]): string {
  const rest = restOn(mode, values);
  return rest === null ? "–" : figure(rest, 1);
}
