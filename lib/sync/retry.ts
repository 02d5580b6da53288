const FIRST_MS = 1_000;
const LONGEST_MS = 60_000;

/**
 * How long to wait before the next try: full jitter under a bound that doubles from one second to a minute, for ever.
 * `failures` counts the tries that failed in a row (1 = the first), `chance` is drawn evenly from [0, 1).
 */
export function retryDelay(failures: number, chance: number): number {
  const bound = Math.min(LONGEST_MS, FIRST_MS * 2 ** Math.min(failures - 1, 10));
  return chance * bound;
}

/** The wait a server asked for with `Retry-After` (seconds or a date) in milliseconds; null where it can't be read. Source: RFC 9110 §10.2.3. */
export function retryAfterMs(header: string | null, now: number): number | null {
  if (header === null) return null;
  if (/^\d+$/.test(header.trim())) return Number(header) * 1_000;
  const until = Date.parse(header);
  return Number.isNaN(until) ? null : Math.max(0, until - now);
}
