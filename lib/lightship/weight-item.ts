/** A mass and its place: tonnes, metres, the frame of `lib/frame.ts`. */
export type WeightItem = { readonly mass: number; readonly x: number; readonly y: number; readonly z: number };

/** A mass and its three moments about the origin of the frame [t, t·m]. */
export type Moments = { readonly mass: number; readonly along: number; readonly athwart: number; readonly upward: number };

/** Where a sum of weights has its centre. */
export type Centre = { readonly mass: number; readonly lcg: number; readonly tcg: number; readonly vcg: number };

export const nothing: Moments = { mass: 0, along: 0, athwart: 0, upward: 0 };

/** The mass of a weight and its moments: mass · x, mass · y, mass · z. */
export function momentsOf({ mass, x, y, z }: WeightItem): Moments {
  return { mass, along: mass * x, athwart: mass * y, upward: mass * z };
}

/** The sum of two balances, mass and moments alike. */
export function plus(a: Moments, b: Moments): Moments {
  return { mass: a.mass + b.mass, along: a.along + b.along, athwart: a.athwart + b.athwart, upward: a.upward + b.upward };
}

/** One balance less another, mass and moments alike. */
export function minus(a: Moments, b: Moments): Moments {
  return { mass: a.mass - b.mass, along: a.along - b.along, athwart: a.athwart - b.athwart, upward: a.upward - b.upward };
}

/** Mass and moments of weights together; of none, zero. */
export function total(items: readonly WeightItem[]): Moments {
  return items.map(momentsOf).reduce(plus, nothing);
}

/** The common centre of weights whose mass is not zero. */
export function centreOf({ mass, along, athwart, upward }: Moments): Centre {
  return { mass, lcg: along / mass, tcg: athwart / mass, vcg: upward / mass };
}
