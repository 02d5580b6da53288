/** What a column holds; each quantity has its own units. */
export type Quantity = "length" | "volume" | "area" | "inertia" | "mass" | "density" | "words";

type Unit = {
  /** how a heading may write it, in small letters */
  readonly written: readonly string[];
  /** into the program's own unit; density of the liquid that tonnes are of [t/m³] */
  readonly toOwn: (value: number, density: number) => number;
};

// 1 ft = 0.3048 m and 1 lb = 0.45359237 kg exactly; a long ton is 2240 lb. Source: international yard and pound agreement (1959)
const foot = 0.3048;
const inch = 0.0254;
const longTon = (2240 * 0.45359237) / 1000;

/**
 * The units of each quantity; the first is the program's own: m, m³, m², m⁴, t, t/m³.
 *
 *     volume = mass/ρ,   A_W = 100·TPC/ρ,   i = moment of free surface/ρ
 *
 * Source: definitions; TPC is the mass that sinks the ship by a centimetre, A_W·ρ/100.
 */
export const units: Readonly<Record<Quantity, Readonly<Record<string, Unit>>>> = {
  length: {
    m: { written: ["m", "metre", "metres", "meter", "meters", "mtr"], toOwn: (value) => value },
    cm: { written: ["cm"], toOwn: (value) => value / 100 },
    mm: { written: ["mm", "millimetres", "millimeters"], toOwn: (value) => value / 1000 },
    ft: { written: ["ft", "feet", "foot", "'"], toOwn: (value) => value * foot },
    in: { written: ["in", "inch", "inches", '"'], toOwn: (value) => value * inch },
  },
  volume: {
    "m³": { written: ["m3", "m³", "m^3", "cbm", "cu m", "cu.m"], toOwn: (value) => value },
    t: { written: ["t", "tonnes", "tonne", "mt", "metric tons"], toOwn: (value, density) => value / density },
    "long tons": {
      written: ["lt", "l.t.", "long tons", "long ton", "tons", "ton"],
      toOwn: (value, density) => (value * longTon) / density,
    },
    "ft³": { written: ["ft3", "ft³", "ft^3", "cu ft", "cu.ft", "cubic feet"], toOwn: (value) => value * foot ** 3 },
    litres: { written: ["l", "litres", "liters"], toOwn: (value) => value / 1000 },
  },
  area: {
    "m²": { written: ["m2", "m²", "m^2", "sq m", "sq.m"], toOwn: (value) => value },
    "t/cm": { written: ["t/cm", "tonnes/cm", "t per cm", "tpc"], toOwn: (value, density) => (100 * value) / density },
    "long tons/in": {
      written: ["lt/in", "tons/in", "long tons/in", "tpi"],
      toOwn: (value, density) => (value * longTon) / (inch * density),
    },
    "ft²": { written: ["ft2", "ft²", "ft^2", "sq ft", "sq.ft"], toOwn: (value) => value * foot ** 2 },
  },
  inertia: {
    "m⁴": { written: ["m4", "m⁴", "m^4"], toOwn: (value) => value },
    t·m: { written: ["t·m", "tm", "t.m", "t*m", "t-m", "mt-m"], toOwn: (value, density) => value / density },
    "ft⁴": { written: ["ft4", "ft⁴", "ft^4"], toOwn: (value) => value * foot ** 4 },
  },
  mass: {
    t: { written: ["t", "tonnes", "tonne", "mt"], toOwn: (value) => value },
    "long tons": { written: ["lt", "l.t.", "long tons", "long ton", "tons", "ton"], toOwn: (value) => value * longTon },
  },
  density: {
    "t/m³": { written: ["t/m3", "t/m³", "g/cm3", "g/cm³", "kg/l", "s.g.", "sg"], toOwn: (value) => value },
    "kg/m³": { written: ["kg/m3", "kg/m³"], toOwn: (value) => value / 1000 },
  },
  words: { "": { written: [], toOwn: (value) => value } },
};

/** The program's own unit of a quantity. */
export function ownUnit(quantity: Quantity): string {
  return Object.keys(units[quantity])[0] as string;
}

/** The unit that some words mean for a quantity; null where they mean none. */
export function unitWritten(quantity: Quantity, words: string): string | null {
  const plain = words.trim().toLowerCase().replace(/\.$/, "");
  const found = Object.entries(units[quantity]).find(([, { written }]) => written.includes(plain));
  return found ? found[0] : null;
}

/** A value in the program's own unit. Broken promise: the unit is one of the quantity's. */
export function inOwnUnit(value: number, quantity: Quantity, unit: string, density: number): number {
  const known = units[quantity][unit];
  if (!known) throw new RangeError(`${unit} is no unit of ${quantity}`);
  return unit === ownUnit(quantity) ? value : toNano(known.toOwn(value, density));
}

/** Drops what binary fractions add behind the ninth decimal: 14.700000000000001 is 14.7. */
export function toNano(value: number): number {
  return Math.round(value * 1e9) / 1e9;
}
