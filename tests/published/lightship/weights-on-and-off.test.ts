import { describe, expect, it } from "vitest";
import { classicalTerm } from "@/lib/inclining/classical-relation";
import { type Centre, centreOf, total } from "@/lib/lightship/weight-item";
import { promised } from "@/lib/result";

type Loading = {
  readonly name: string;
  /** weight and vcg; taken off where negative */
  readonly rows: readonly (readonly [number, number])[];
  readonly moment?: number;
  readonly vcg?: number;
  readonly metacentre?: number;
  readonly gm?: number;
  /** half of the last digit that is printed */
  readonly within: number;
};

/** Source: Nicholls's Seamanship and Nautical Knowledge, printed pages 517, 532, 534 and 535; tons and feet. */
const nicholls: readonly Loading[] = [
  {
    name: "question 31",
    rows: [
      [2000, 17],
      [5000, 16],
      [300, 10],
      [100, 20],
    ],
    vcg: 16.1,
    within: 0.05,
  },
  {
    name: "question 27",
    rows: [
      [3250, 20],
      [1000, 24],
      [1500, 22],
      [1250, 21],
      [1100, 19],
      [900, 23],
      [600, 25],
      [400, 18],
    ],
    moment: 212050,
    vcg: 21.2,
    metacentre: 22,
    gm: 0.8,
    within: 0.05,
  },
  {
    name: "question 22",
    rows: [
      [4500, 18],
      [10000, 20],
      [2000, 30],
    ],
    metacentre: 22,
    gm: 1.3,
    within: 0.05,
  },
  {
    name: "question 21",
    rows: [
      [6000, 16],
      [-1500, 21],
      [-2000, 17],
      [-1200, 12],
    ],
    metacentre: 13.5,
    gm: 1.1,
    within: 0.05,
  },
  {
    name: "question 20",
    rows: [
      [1600, 12],
      [500, 12],
      [750, 14],
      [620, 16],
      [550, 18],
      [400, 20],
      [300, 22],
      [200, 23],
    ],
    metacentre: 17,
    gm: 1.8,
    within: 0.05,
  },
];

/** Source: marinegyaan.com, chapters 6 and 7; tonnes and metres. */
const marineGyaan: readonly Loading[] = [
  {
    name: "200 t low in the ship",
    rows: [
      [8800, 6.2],
      [200, 1.7],
    ],
    moment: 54900,
    vcg: 6.1,
    within: 1e-6,
  },
  {
    name: "600 t taken off",
    rows: [
      [12600, 6],
      [-600, 11],
    ],
    moment: 69000,
    vcg: 5.75,
    within: 1e-6,
  },
  // the page prints a moment of 41000 t·m and a weight of 12600 t for the 9900 t it computes with: the moment is 41100 t·m
  {
    name: "100 t on deck",
    rows: [
      [9900, 4],
      [100, 15],
    ],
    moment: 41100,
    vcg: 4.11,
    within: 1e-6,
  },
  // the page prints 3400 for the first moment, 8400, and a total of 300 for 3000 t; its own result is right
  {
    name: "four parcels",
    rows: [
      [2000, 4.2],
      [300, 2],
      [200, 3.2],
      [500, 1],
    ],
    moment: 10140,
    vcg: 3.38,
    within: 1e-6,
  },
];

describe("published centres of gravity after loading and discharging", () => {
  it.each([...nicholls, ...marineGyaan])("$name", ({ rows, moment, vcg, metacentre, gm, within }) => {
    const moments = total(rows.map(([mass, z]) => ({ mass, x: 0, y: 0, z })));
    const centre: Centre = centreOf(moments);
    if (moment !== undefined) expect(moments.upward).toBeCloseTo(moment, 6);
    if (vcg !== undefined) expect(Math.abs(centre.vcg - vcg)).toBeLessThanOrEqual(within);
    if (metacentre !== undefined && gm !== undefined) expect(Math.abs(metacentre - centre.vcg - gm)).toBeLessThanOrEqual(within);
  });

  it.each([
    { name: "4000 tons, 40 tons 20 ft down", displacement: 4000, gm: 1.2, weight: 40, down: 20, published: 1.4 },
    { name: "5000 tons of negative GM, 200 tons 20 ft down", displacement: 5000, gm: -3 / 12, weight: 200, down: 20, published: 6.6 / 12 },
  ])("shift downward, Nicholls: $name", ({ displacement, gm, weight, down, published }) => {
    const before = [
      { mass: displacement, x: 0, y: 0, z: 0 },
      { mass: -weight, x: 0, y: 0, z: down },
      { mass: weight, x: 0, y: 0, z: 0 },
    ];
    expect(gm - centreOf(total(before)).vcg).toBeCloseTo(published, 12);
  });

  it("light ship of 2800 t, Barrass and Derrett (2012), from memory: GM 1.3 m", () => {
    const loads = total(
      [
        [400, 6],
        [700, 4.5],
      ].map(([mass = 0, z = 0]) => ({ mass, x: 0, y: 0, z })),
    );
    const light = centreOf({ ...loads, mass: 2800, upward: 5.3 * (2800 + loads.mass) - loads.upward });
    expect(6.7 - light.vcg).toBeCloseTo(1.3, 6);
  });
});

/** Source: Derrett, Ship Stability for Masters and Mates, exercise 9 of the chapter on the inclining experiment; from memory. */
describe("a published inclining with weights on and off", () => {
  const tanHeel = 0.12 / 6;
  const gm = promised(classicalTerm("gmFluid", { displacement: 8000, weight: 4, distance: 19, tanHeel }));

  it("heels 1.146°", () => {
    expect((Math.atan(tanHeel) * 180) / Math.PI).toBeCloseTo(1.1458, 4);
  });

  it("leaves 8050 t with its centre at 8.52 m", () => {
    const asInclined = { mass: 8000, x: 0, y: 0, z: 9 - gm };
    const toGoOn = { mass: 75, x: 0, y: 0, z: 7.65 };
    const toComeOff = { mass: -25, x: 0, y: 0, z: 8.16 };
    const light = centreOf(total([asInclined, toGoOn, toComeOff]));
    expect(light.mass).toBe(8050);
    // printed to the centimetre
    expect(Math.abs(light.vcg - 8.52)).toBeLessThanOrEqual(0.005);
  });
});
