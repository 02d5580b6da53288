import { turningPointsAlternate } from "@/lib/inclining/resting-point";
import type { BattenValue } from "@/lib/inclining/test-readings";
import type { Station } from "./batten-entry";
import { battenInWords } from "./batten-in-words";
import { earlierRests, type Read, restOfValue } from "./earlier-rests";

const TIMES_THE_RANGE = 2;

/** What the reader is asked to look at again before this is saved, in words; null where nothing stands out. */
export function secondLookAt(value: BattenValue, station: Station, move: number, own: readonly Read[]): string | null {
  if (value.mode === "turning-points" && swingsOf(value).some((swing) => !turningPointsAlternate(swing))) {
    return `Two turning points in a row lie on the same side (${swingsOf(value).flat().join(", ")}).`;
  }
  const rest = restOfValue(value);
  const isFar = rest !== null && deservesSecondLook(rest, earlierRests(own, station, move));
  return isFar ? `${battenInWords(value)} is far from what this station has read before.` : null;
}

/**
 * Whether a reading lies so far from this station's earlier readings on this phone that the reader should look again.
 *
 * Far: further from the nearest earlier reading than twice the range of all of them. Never asked before two readings
 * that differ are known. It knows no prediction and nobody else's reading, so it can't hint at either.
 * Unit of the values given. Source: *common practice*.
 */
export function deservesSecondLook(value: number, earlier: readonly number[]): boolean {
  const range = Math.max(...earlier) - Math.min(...earlier);
  if (earlier.length < 2 || range === 0) return false;
  const nearest = Math.min(...earlier.map((each) => Math.abs(each - value)));
  return nearest > TIMES_THE_RANGE * range;
}

function swingsOf(value: BattenValue): readonly (readonly number[])[] {
  if ("valuesMm" in value) return [value.valuesMm];
  return "valuesDegrees" in value ? [value.valuesDegrees] : [value.portMm, value.starboardMm];
}
