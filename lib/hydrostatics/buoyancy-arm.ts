import { answer, type Result } from "@/lib/result";
import { type Afloat, atDisplacementAndHeel, type EquilibriumRefusal } from "./equilibrium";
import type { Hull } from "./hull";

/** Where the line of buoyancy stands at a heel: y_B + c·z_B [m], and how it changes with c = tan(heel). */
export type ArmAt = { readonly tanHeel: number; readonly arm: number; readonly slope: number };

/** The arm over a range of heels, and the nodes it runs through. */
export type BuoyancyArm = {
  readonly at: (tanHeel: number) => ArmAt;
  readonly from: number;
  readonly to: number;
  readonly nodes: readonly ArmAt[];
};

type Held = Afloat & { readonly volume: number; readonly lcg: number; readonly vcg: number };

/**
 * The arm of buoyancy over a range of heels, the volume kept and the trim free:
 *
 *     f(c) = y_B(c) + c·z_B(c),   f′(c) = KM_T(c) = z_B + BM_T·(1 + c²)
 *
 * Found at nodes by equilibrium of the hull, between them by cubics through values and slopes (Hermite): below 1e-6 m on
 * smooth hulls with nodes a degree apart, and below 1e-4 m where a knuckle meets the water between two of them.
 * Refused: what the hull can't carry at a node.
 * Source: G on the line of buoyancy, common practice; Hermite interpolation, common practice.
 */
export function buoyancyArm(hull: Hull, held: Held, from: number, to: number, nodes: number): Result<BuoyancyArm, EquilibriumRefusal> {
  const found: ArmAt[] = [];
  let guess = held.guess;
  for (let i = 0; i < nodes; i++) {
    const tanHeel = from + ((to - from) * i) / (nodes - 1);
    const rest = atDisplacementAndHeel(hull, { ...held, tanHeel, ...(guess && { guess }) });
    if (!rest.ok) return rest;
    guess = rest.value.plane;
    const { tcb, vcb, kmt } = rest.value.hydrostatics;
    found.push({ tanHeel, arm: tcb + tanHeel * vcb, slope: kmt });
  }
  return answer(armThrough(found));
}

/** An arm through nodes in the order of their heels: cubics between them, straight on beyond. */
export function armThrough(nodes: readonly ArmAt[]): BuoyancyArm {
  const [first, last] = [nodes[0] as ArmAt, nodes.at(-1) as ArmAt];
  return { from: first.tanHeel, to: last.tanHeel, nodes, at: (tanHeel) => between(nodes, tanHeel) };
}

// outside the range the last slope goes on: a search may look there on its way
function between(nodes: readonly ArmAt[], tanHeel: number): ArmAt {
  const [first, last] = [nodes[0] as ArmAt, nodes.at(-1) as ArmAt];
  if (tanHeel <= first.tanHeel) return straight(first, tanHeel);
  if (tanHeel >= last.tanHeel) return straight(last, tanHeel);
  const next = nodes.findIndex((node) => node.tanHeel > tanHeel);
  return cubic(nodes[next - 1] as ArmAt, nodes[next] as ArmAt, tanHeel);
}

function straight({ tanHeel: from, arm, slope }: ArmAt, tanHeel: number): ArmAt {
  return { tanHeel, arm: arm + slope * (tanHeel - from), slope };
}

function cubic(a: ArmAt, b: ArmAt, tanHeel: number): ArmAt {
  const h = b.tanHeel - a.tanHeel;
  const t = (tanHeel - a.tanHeel) / h;
  const rise = b.arm - a.arm;
  // a.arm + s·t + p·t² + q·t³ with the slopes of both ends
  const s = h * a.slope;
  const p = 3 * rise - 2 * s - h * b.slope;
  const q = s + h * b.slope - 2 * rise;
  return { tanHeel, arm: a.arm + t * (s + t * (p + t * q)), slope: (s + t * (2 * p + 3 * t * q)) / h };
}
