import type { CheckLimits } from "@/lib/inclining/checks/check-limits";
import { type Finding, metOrAttention } from "@/lib/inclining/checks/finding";
import { sum } from "@/lib/numerics/sum";
import type { Lightship, LightshipItem } from "./lightship";

/**
 * How complete the ship was: what was still to come aboard and what was to go ashore, as shares of the lightship. Liquids,
 * test weights and persons are lists of their own and are not surplus here.
 */
export function completeness(items: readonly LightshipItem[], { displacement }: Lightship, limits: CheckLimits): readonly Finding[] {
  const missing = massOf(items, "add") / displacement;
  const surplus = massOf(items, "deduct") / displacement;
  return [
    { id: "missing", verdict: metOrAttention(missing <= limits.missing), found: { share: missing }, limit: { share: limits.missing } },
    { id: "surplus", verdict: metOrAttention(surplus <= limits.surplus), found: { share: surplus }, limit: { share: limits.surplus } },
  ];
}

function massOf(items: readonly LightshipItem[], action: LightshipItem["action"]): number {
  return sum(items.filter((item) => item.action === action).map(({ mass }) => mass));
}
