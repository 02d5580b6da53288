import type { Liquid } from "../liquids";
import type { CheckLimits } from "./check-limits";
import type { CheckedTest } from "./checked-test";
import { type Finding, metOrAttention, type Range } from "./finding";

/**
 * Slack tanks, ballast that shifts left aside. A pair is two of one place along the ship, alike to port and to starboard;
 * it counts as one group, as a tank by itself does.
 */
export function slackTanks(test: CheckedTest, liquids: readonly Liquid[], { slackGroups: groups }: CheckLimits): Finding {
  const slack = slackLiquids(test, liquids);
  const found = { slack: slack.map(({ id }) => id), groups: groupsOf(slack) };
  return { id: "slack-tanks", verdict: metOrAttention(found.groups <= groups), found, limit: { groups } };
}

/** Whether slack tanks whose kind is known are filled so far that their surface keeps its breadth when the ship heels. */
export function slackLevels(
  test: CheckedTest,
  liquids: readonly Liquid[],
  { deepTank: deep, doubleBottomTank: doubleBottom }: CheckLimits,
): readonly Finding[] {
  const judged = slackLiquids(test, liquids).flatMap(({ id, volume }) => {
    const tank = test.tanks.find((each) => each.id === id);
    if (tank?.kind === undefined) return [];
    const filled = volume / Math.max(...tank.table.map((row) => row.volume));
    return [{ tank: id, filled, range: tank.kind === "deep" ? deep : doubleBottom }];
  });
  if (judged.length === 0) return [];
  const outside = judged.filter(({ filled, range }) => !isIn(filled, range)).map(({ tank, filled }) => ({ tank, filled }));
  const found = { outside, judged: judged.length };
  return [{ id: "slack-levels", verdict: metOrAttention(outside.length === 0), found, limit: { deep, doubleBottom } }];
}

function slackLiquids({ tanks }: CheckedTest, liquids: readonly Liquid[]): readonly Liquid[] {
  const shifting = new Set(tanks.filter(({ shifts }) => shifts).map(({ id }) => id));
  return liquids.filter(({ id, freeSurfaceInertia }) => freeSurfaceInertia > 0 && !shifting.has(id));
}

function groupsOf(slack: readonly Liquid[]): number {
  const [first, ...rest] = slack;
  if (first === undefined) return 0;
  const twin = rest.find((other) => isTwin(first, other));
  return 1 + groupsOf(rest.filter((other) => other !== twin));
}

// tanks of a pair are built alike; their contents may differ by what was sounded
function isTwin(a: Liquid, b: Liquid): boolean {
  const off = Math.max(Math.abs(a.tcg), Math.abs(b.tcg));
  return a.tcg * b.tcg < 0 && Math.abs(a.tcg + b.tcg) <= 0.2 * off && Math.abs(a.lcg - b.lcg) <= 1;
}

function isIn(value: number, [low, high]: Range): boolean {
  return value >= low - 1e-9 && value <= high + 1e-9;
}
