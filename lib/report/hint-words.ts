import type { Hint, HintCause } from "@/lib/inclining/plot-hints";
import { figure, signedFigure } from "./rounding";

type Words = { readonly name: string; readonly evidence: (hint: Hint) => string; readonly advice: (moves: string) => string };

const words: Readonly<Record<HintCause, Words>> = {
  "free-liquid": {
    name: "Free liquid",
    evidence: ({ evidence }) => `more heel per moment as the moment grows: ${percent(evidence.share)} more at the largest`,
    advice: (moves) => `Look for slack tanks, open cross-overs and water in bilges or on deck; then repeat ${moves}.`,
  },
  restraint: {
    name: "Restraint by the bottom or a mooring",
    evidence: ({ evidence }) =>
      `the plot flattens to ${evidence.size < 0 ? "starboard" : "port"}: ${percent(evidence.share)} of the largest heel is missing at its end`,
    advice: (moves) => `Check the clearance under the keel, moorings, gangway and hoses; then repeat ${moves}.`,
  },
  "steady-wind": {
    name: "Steady wind or current",
    evidence: ({ evidence, moves }) => `${offset(evidence.size)} from move ${moves[0] ?? 0} on, alike at every moment`,
    advice: () => "Harmless where zero is read on both sides of it: read zero again, or repeat the moves before it.",
  },
  gust: {
    name: "Gust, or a misread batten where one station was read",
    evidence: ({ evidence }) => `${offset(evidence.size)} at this move only, at all stations`,
    advice: (moves) => `Repeat ${moves} in a calm, with slack moorings.`,
  },
  misread: {
    name: "Misread batten",
    evidence: ({ evidence }) => `station ${evidence.stations.join(" or ")} stands ${offset(evidence.size)} from the other stations`,
    advice: (moves) => `Read the batten again, or repeat ${moves}; look whether the bob was free.`,
  },
};

/** What is likely the matter, as a heading names it. */
export function hintName(cause: HintCause): string {
  return words[cause].name;
}

/** What speaks for a hint, with its numbers. */
export function hintEvidence(hint: Hint): string {
  const session = hint.session > 1 ? `session ${hint.session}: ` : "";
  return `${session}${words[hint.cause].evidence(hint)}; scatter alone shows as much in ${chance(hint.evidence.probability)}`;
}

/** What to look for, and the moves to repeat. */
export function hintAdvice({ cause, moves }: Hint): string {
  return words[cause].advice(movesInWords(moves));
}

/** Moves by their numbers: "move 3", "moves 2 and 6", "moves 1, 2 and 3". */
export function movesInWords(moves: readonly number[]): string {
  if (moves.length < 2) return `move ${moves[0] ?? ""}`.trimEnd();
  return `moves ${moves.slice(0, -1).join(", ")} and ${moves.at(-1)}`;
}

function offset(size: number): string {
  return `${signedFigure(1000 * size, 2)} mm per m`;
}

function percent(share: number): string {
  return `${figure(100 * Math.abs(share), 1)} %`;
}

function chance(probability: number): string {
  return probability < 0.0001 ? "fewer than 1 of 10 000 cases" : `${figure(10_000 * probability, 0)} of 10 000 cases`;
}
