import type { MoveOnLine } from "@/lib/inclining/inclined-ship";

/** The largest heel that the trade's rules allow in a test. Source: IMO 2008 IS Code, part B annex 1 *from memory*. */
export const mostHeelDegrees = 4;

/** The moves at which the ship heeled more than a test may take her. */
export function heeledTooFar(moves: readonly MoveOnLine[]): MoveOnLine[] {
  const most = Math.tan((mostHeelDegrees * Math.PI) / 180);
  return moves.filter((move) => Math.abs(move.tanHeel) > most);
}
