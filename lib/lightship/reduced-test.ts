import { type Faults, inside } from "@/lib/inclining/faults";
import { type InclinedShip, incliningTest } from "@/lib/inclining/inclining-test";
import type { IncliningTestData } from "@/lib/inclining/test-data";
import { answer, type Result } from "@/lib/result";
import { type Lightship, type LightshipBalance, type LightshipItem, lightshipBalance, lightshipOf } from "./lightship";

/** A test reduced once, from which its result, its checks and its intervals follow. */
export type ReducedTest = { readonly ship: InclinedShip; readonly balance: LightshipBalance; readonly lightship: Lightship };

/** From the readings to the ship as inclined and her lightship. Refused with every fault and its place in the record. */
export function reducedTest(test: IncliningTestData & { readonly items: readonly LightshipItem[] }): Result<ReducedTest, Faults> {
  const ship = incliningTest(test);
  if (!ship.ok) return ship;
  const balance = inside("items", lightshipBalance(ship.value, test));
  return balance.ok ? answer({ ship: ship.value, balance: balance.value, lightship: lightshipOf(balance.value) }) : balance;
}
