import type { AsInclined } from "@/lib/inclining/inclined-ship";
import type { InclinedShip } from "@/lib/inclining/inclining-test";
import type { IncliningTestData } from "@/lib/inclining/test-data";
import type { Aboard } from "@/lib/inclining/test-plan";
import { answer, type Result, refuse } from "@/lib/result";
import { type Centre, centreOf, type Moments, minus, momentsOf, plus, total, type WeightItem } from "./weight-item";

/** What does not stand as it will on the ship as built: to go ashore, to come aboard, to be put in its place. */
export type LightshipItem =
  | (WeightItem & { readonly action: "deduct" | "add"; readonly label: string })
  | (WeightItem & {
      readonly action: "relocate";
      readonly label: string;
      readonly toX: number;
      readonly toY: number;
      readonly toZ: number;
    });

export type Lightship = { readonly displacement: number; readonly lcg: number; readonly tcg: number; readonly vcg: number };

/** The way from as inclined to lightship, each line with its mass and three moments. */
export type LightshipBalance = {
  readonly asInclined: Moments;
  readonly testWeights: Moments;
  readonly persons: Moments;
  readonly liquids: Moments;
  readonly deducted: Moments;
  readonly added: Moments;
  /** mass 0 */
  readonly relocated: Moments;
  readonly lightship: Moments;
};

export type NothingLeft = { readonly type: "NothingLeft"; readonly mass: number };

/**
 * Lightship from the ship as inclined, mass and three moments alike:
 *
 *     as inclined − test weights − persons − liquids − items to go ashore + items to come aboard ± items to relocate
 *
 * Test weights as they stood at move 0; persons as they were aboard while the drafts were read, because the ship as inclined
 * is brought to that state; liquids at their centres as sounded. Tonnes, metres, t·m.
 * Refused: more taken off than floated.
 * Source: IMO 2008 IS Code, part B ch. 8 *from memory*.
 */
export function lightshipBalance(
  ship: InclinedShip,
  test: Pick<IncliningTestData, "weights" | "moves" | "aboard"> & { readonly items: readonly LightshipItem[] },
): Result<LightshipBalance, NothingLeft> {
  const asInclined = momentsAsInclined(ship.asInclined);
  const testWeights = total(weightsAtZero(test));
  const persons = total(test.aboard.filter(isAboardForDrafts));
  const liquids = total(ship.liquids.map(({ mass, lcg, tcg, vcg }) => ({ mass, x: lcg, y: tcg, z: vcg })));
  const deducted = total(test.items.filter(({ action }) => action === "deduct"));
  const added = total(test.items.filter(({ action }) => action === "add"));
  const relocated = test.items.map(changeByRelocation).reduce(plus, total([]));
  const off = [testWeights, persons, liquids, deducted].reduce(plus);
  const lightship = plus(minus(asInclined, off), plus(added, relocated));
  if (!(lightship.mass > 0)) return refuse({ type: "NothingLeft", mass: lightship.mass });
  return answer({ asInclined, testWeights, persons, liquids, deducted, added, relocated, lightship });
}

/** Displacement and centre of gravity of the lightship of a balance. */
export function lightshipOf({ lightship }: LightshipBalance): Lightship {
  const { mass, ...centre }: Centre = centreOf(lightship);
  return { displacement: mass, ...centre };
}

/**
 * The lightship's KG by the generalised reduction: everything else in the balance stays as it is,
 *
 *     KG = KG_classical + (KG_generalised − KG_classical, both as inclined)·Δ/Δ_lightship
 *
 * Null where the ship has no generalised KG. Source: moments about the baseline, definition.
 */
export function generalisedVcgOf({ displacement, vcg }: Lightship, { asInclined, generalised }: InclinedShip): number | null {
  return generalised === null ? null : vcg + ((generalised.vcg - asInclined.vcg) * asInclined.displacement) / displacement;
}

function momentsAsInclined({ displacement, lcg, tcg, vcg }: AsInclined): Moments {
  return momentsOf({ mass: displacement, x: lcg, y: tcg, z: vcg });
}

function weightsAtZero({ weights, moves }: Pick<IncliningTestData, "weights" | "moves">): WeightItem[] {
  const zero = moves.findLast(({ no, session }) => no === 0 && (session ?? 1) === 1);
  return weights.flatMap(({ id, mass }) => {
    const place = zero?.positions[id];
    return place === undefined ? [] : [{ mass, x: place[0], y: place[1], z: place[2] }];
  });
}

function isAboardForDrafts({ during }: Aboard): boolean {
  return during !== "moves";
}

function changeByRelocation(item: LightshipItem): Moments {
  if (item.action !== "relocate") return total([]);
  return minus(momentsOf({ mass: item.mass, x: item.toX, y: item.toY, z: item.toZ }), momentsOf(item));
}
