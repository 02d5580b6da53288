/** Sequence numbers as a person says them: 12, 13, 14, 20 → "12–14, 20". */
export function runsInWords(numbers: readonly number[]): string {
  const sorted = [...new Set(numbers)].sort((one, other) => one - other);
  const runs: [number, number][] = [];
  for (const number of sorted) {
    const last = runs.at(-1);
    if (last && number === last[1] + 1) last[1] = number;
    else runs.push([number, number]);
  }
  return runs.map(([from, to]) => (from === to ? String(from) : `${from}–${to}`)).join(", ");
}
