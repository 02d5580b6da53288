import type { CheckLimits } from "./check-limits";
import type { CheckedTest } from "./checked-test";
import { type Finding, metOrAttention } from "./finding";

/** Whether as many people were aboard at every move; null where fewer than two moves have it noted. */
export function headcount(test: CheckedTest): Finding {
  const counts = noted(test, ({ headcount: count }) => count);
  const found = counts.length < 2 ? null : { least: Math.min(...counts), most: Math.max(...counts) };
  const verdict = found === null ? "attention" : found.least === found.most ? "met" : "not-met";
  return { id: "headcount", verdict, found, limit: null };
}

/** The least clearance under the keel that was noted [m]. */
export function underKeel(test: CheckedTest, { underKeel: least }: CheckLimits): Finding {
  const clearances = noted(test, (conditions) => conditions.underKeel);
  const found = clearances.length === 0 ? null : { least: Math.min(...clearances) };
  return { id: "under-keel", verdict: metOrAttention(found !== null && found.least >= least), found, limit: { least } };
}

/** Weights and hydrometers whose certificate is not named. A record holds no date of it: its age is read by eye. */
export function certificates({ weights, hydrometers = [] }: CheckedTest): Finding {
  const without = [...weights, ...hydrometers].filter(({ certificate }) => certificate === undefined).map(({ id }) => id);
  return { id: "certificates", verdict: metOrAttention(without.length === 0), found: { without }, limit: null };
}

type Conditions = NonNullable<CheckedTest["readings"]["conditions"]>[number];

function noted({ readings }: CheckedTest, read: (conditions: Conditions) => number | undefined): number[] {
  const accepted = (readings.conditions ?? []).filter(({ status = "accepted" }) => status === "accepted");
  return accepted.flatMap((conditions) => read(conditions) ?? []);
}
