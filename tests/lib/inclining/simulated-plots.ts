import { commonLine } from "@/lib/inclining/common-line";
import type { MomentTangentLine } from "@/lib/inclining/inclined-ship";
import type { HintCause } from "@/lib/inclining/plot-hints";
import type { Noise } from "@/lib/numerics/seeded-noise";
import { promised } from "@/lib/result";
import { eightMovements } from "./sample-line";

export type Kind = HintCause | "none";

/** Three pendulums; heel 0.035 (2°) at the largest moment. */
const lengths = [4, 4.5, 5];
const largestHeel = 0.035;
/** Scatter that all stations share at a move [tangent], and that of each reading [m on the batten]. */
const ofMove = 0.15e-3;
const ofReading = 0.5e-3;

/** What readings of half a millimetre leave open in a move's mean [tangent]. */
export const readingsAlone = Math.sqrt(lengths.reduce((total, length) => total + (ofReading / length) ** 2, 0)) / lengths.length;

/**
 * A plot of eight movements that is bent for one cause, at a strength of 1 between
 *
 *     free liquid 5 to 12 % more heel at the largest moment; restraint 20 to 70 % less heel per moment, from a moment up to four
 *     tenths of the largest; wind 0.8 to 2.5 mm per m from any move; gust 1 to 3 mm per m at any move; misread 4 to 12 mm on one batten
 */
export function simulatedPlot(kind: Kind, strength: number, noise: Noise): MomentTangentLine {
  const bend = bentBy(kind, strength, noise);
  const common = eightMovements.map(() => noise.normal(ofMove));
  const misread = kind === "misread" ? misreadAt(strength, noise) : null;
  const series = lengths.map((length, j) => ({
    id: "ABC".charAt(j),
    series: 1,
    session: 1,
    tangents: eightMovements.map((moment, move) => {
      const read = noise.normal(ofReading / length) + (misread?.move === move && misread.station === j ? misread.mm / 1000 / length : 0);
      return { move, tan: bend(moment, move) + (common[move] as number) + read, uncertainty: ofReading / length };
    }),
  }));
  return promised(
    commonLine(
      series,
      eightMovements.map((moment, no) => ({ no, session: 1, moment })),
    ),
  );
}

type Bend = (moment: number, move: number) => number;

function bentBy(kind: Kind, strength: number, noise: Noise): Bend {
  const side = sideOf(noise);
  const straight: Bend = (moment) => (largestHeel * moment) / 200;
  const between = (low: number, high: number) => strength * (low + (high - low) * noise.uniform());
  if (kind === "free-liquid") {
    const more = between(0.05, 0.12);
    return (moment, move) => straight(moment, move) * (1 + (more * Math.abs(moment)) / 200);
  }
  if (kind === "restraint") {
    const held = between(0.2, 0.7);
    const from = 80 * noise.uniform();
    return (moment, move) => straight(moment - side * held * Math.max(0, side * moment - from), move);
  }
  if (kind === "steady-wind") {
    const [first, heel] = [2 + Math.floor(6 * noise.uniform()), side * between(0.8e-3, 2.5e-3)];
    return (moment, move) => straight(moment, move) + (move >= first ? heel : 0);
  }
  if (kind === "gust") {
    const [at, heel] = [Math.floor(9 * noise.uniform()), side * between(1e-3, 3e-3)];
    return (moment, move) => straight(moment, move) + (move === at ? heel : 0);
  }
  return straight;
}

function misreadAt(strength: number, noise: Noise) {
  const mm = sideOf(noise) * strength * (4 + 8 * noise.uniform());
  return { move: Math.floor(9 * noise.uniform()), station: Math.floor(3 * noise.uniform()), mm };
}

function sideOf(noise: Noise): 1 | -1 {
  return noise.uniform() < 0.5 ? 1 : -1;
}
