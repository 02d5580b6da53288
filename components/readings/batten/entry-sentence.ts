import { figure } from "@/lib/report/rounding";
import type { EntryRefusal } from "./batten-entry";

/** Why this can't be saved as it stands, in words; null where nothing has been typed yet and silence is kinder. */
export function entrySentence(refusal: EntryRefusal, unit: "mm" | "°"): string | null {
  switch (refusal.type) {
    case "NothingTyped":
      return refusal.otherLegRead ? `The ${refusal.leg} leg has no reading yet.` : null;
    case "OutsideScale":
      return `${shown(refusal.value)} ${unit} is not on this scale: it runs from ${shown(refusal.scale[0])} to ${shown(refusal.scale[1])} ${unit}.`;
    case "TooFewTurningPoints":
      return `${refusal.got} of ${refusal.needed} turning points: the swing needs one more on the other side.`;
  }
}

function shown(value: number): string {
  return figure(value, Number.isInteger(value) ? 0 : 1);
}
