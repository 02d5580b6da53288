import type { Faults } from "@/lib/inclining/faults";
import type { InclinedShip } from "@/lib/inclining/inclining-test";
import { type Examination, examinationOf } from "@/lib/lightship/examination";
import { type IncliningResult, resultOf } from "@/lib/lightship/inclining-result";
import type { Lightship, LightshipBalance } from "@/lib/lightship/lightship";
import { reducedTest } from "@/lib/lightship/reduced-test";
import { type Moments, momentsOf } from "@/lib/lightship/weight-item";
import type { TestRecord } from "@/lib/record/test-record";
import { answer, type Result } from "@/lib/result";
import type { BalanceLine } from "./balance-table";

export type FoundLightship = {
  readonly ship: InclinedShip;
  readonly lines: readonly BalanceLine[];
  readonly lightship: Lightship;
  readonly examination: Examination;
  readonly result: IncliningResult;
};

/** A test's lightship with each line of the way to it. */
export function foundLightship(record: TestRecord): Result<FoundLightship, Faults> {
  const reduced = reducedTest(record);
  if (!reduced.ok) return reduced;
  const { ship, balance, lightship } = reduced.value;
  return answer({
    ship,
    lines: linesOf(balance, ship, record),
    lightship,
    examination: examinationOf(record, reduced.value),
    result: resultOf(record, reduced.value),
  });
}

function linesOf(balance: LightshipBalance, ship: InclinedShip, { items }: TestRecord): BalanceLine[] {
  const off = (label: string, moments: Moments): BalanceLine => ({ label, moments, kind: "off" });
  const on = (label: string, moments: Moments): BalanceLine => ({ label, moments, kind: "on" });
  const liquids = ship.liquids.map(({ id, mass, lcg, tcg, vcg }) => off(`tank ${id}`, momentsOf({ mass, x: lcg, y: tcg, z: vcg })));
  const single = [off("test weights", balance.testWeights), off("persons", balance.persons), ...liquids];
  return [
    { label: "As inclined", moments: balance.asInclined, kind: "as-inclined" },
    ...[...single, ...items.flatMap((item) => (item.action === "deduct" ? [off(item.label, momentsOf(item))] : []))].filter(hasMass),
    ...items.flatMap((item) => (item.action === "add" ? [on(item.label, momentsOf(item))] : [])),
    ...(items.some(({ action }) => action === "relocate") ? [on("items moved to their places", balance.relocated)] : []),
    { label: "Lightship", moments: balance.lightship, kind: "lightship" },
  ];
}

function hasMass({ moments }: BalanceLine): boolean {
  return moments.mass !== 0;
}
