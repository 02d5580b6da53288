const TIMES_THE_RANGE = 2;

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
