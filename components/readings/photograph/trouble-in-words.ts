import type { PhotographTrouble } from "./use-photographs";

/** Why a photograph was not kept, in one sentence; the reading goes on in each case. */
export function troubleInWords(trouble: PhotographTrouble): string {
  switch (trouble) {
    case "NoPicture":
      return "This file is no picture that this browser can read. Save the reading without it.";
    case "TooLarge":
      return "This picture is too large. Save the reading without it.";
    case "NoRoom":
      return "This phone has no room for a photograph. It keeps what is left for readings.";
    case "TakenBefore":
      return "This photograph stands with another reading already.";
    case "NotKept":
      return "The photograph could not be kept. Save the reading without it.";
  }
}
