import type { TankBox } from "@/lib/hydrostatics/box-liquid";
import { boxTankTable } from "@/lib/hydrostatics/box-tank";
import type { TestRecord } from "@/lib/record/test-record";

/** Nine tanks with upright walls: fuel in the double bottom is the one slack pair; the others are pressed full or empty. */
export function skerryTernTanks(): TestRecord["tanks"] {
  return tanks.map(({ box, ...tank }) => ({ ...tank, measure: "sounding", table: boxTankTable(box), box: walls(box) }));
}

function walls({ x, y, z }: TankBox): NonNullable<TestRecord["tanks"][number]["box"]> {
  return { x: [...x], y: [...y], z: [...z] };
}

/** Who and what is aboard for the test only, and what is not yet, or not where it will stand. */
export const skerryTernLoads: Pick<TestRecord, "aboard" | "items"> = {
  aboard: [
    { label: "test lead and witness, wheelhouse", mass: 0.24, x: 38, y: 0, z: 12.4 },
    { label: "readers at the stations", mass: 0.32, x: 24, y: 0, z: 2.6 },
    { label: "deck gang, main deck", mass: 0.4, x: 24, y: 0, z: 6.2 },
    { label: "draft readers, back from the boat", mass: 0.17, x: 20, y: 1.5, z: 6.2, during: "moves" },
  ],
  items: [
    { action: "deduct", label: "staging in the hangar, starboard side", mass: 2.6, x: 15, y: 2.8, z: 7.1 },
    { action: "deduct", label: "welding sets on the working deck", mass: 1.1, x: 10, y: -1.9, z: 6.1 },
    { action: "deduct", label: "contractor's tool container, working deck", mass: 3.4, x: 6, y: 0, z: 6.8 },
    { action: "add", label: "anchors and chain cables", mass: 6.2, x: 51, y: 0, z: 4.4 },
    { action: "add", label: "rescue boat on its davit, port", mass: 1.3, x: 30, y: -4.6, z: 9.3 },
    { action: "relocate", label: "winch drum, lashed forward, belongs aft", mass: 2.2, x: 33, y: 1.2, z: 6.4, toX: 7, toY: 0, toZ: 6.9 },
  ],
};

type BoxTank = Pick<TestRecord["tanks"][number], "id" | "contents" | "density" | "kind"> & { readonly box: TankBox };

const tanks: readonly BoxTank[] = [
  { id: "FW-P", contents: "fresh water", density: 1, kind: "deep", box: { x: [8, 13], y: [-5, -2.5], z: [1.6, 4] } },
  { id: "FW-S", contents: "fresh water", density: 1, kind: "deep", box: { x: [8, 13], y: [2.5, 5], z: [1.6, 4] } },
  { id: "FO-P", contents: "gas oil", density: 0.845, kind: "double-bottom", box: { x: [18, 26], y: [-4.4, -0.4], z: [0.05, 1.05] } },
  { id: "FO-S", contents: "gas oil", density: 0.845, kind: "double-bottom", box: { x: [18, 26], y: [0.4, 4.4], z: [0.05, 1.05] } },
  { id: "FO-D", contents: "gas oil, day tank", density: 0.845, kind: "deep", box: { x: [15, 17], y: [1, 3.5], z: [2.2, 4.2] } },
  { id: "LO", contents: "lubricating oil", density: 0.9, kind: "double-bottom", box: { x: [13.5, 15], y: [-1, 1], z: [0.2, 1] } },
  { id: "BW-F", contents: "sea water, fore peak", density: 1.025, kind: "deep", box: { x: [46, 49], y: [-1.2, 1.2], z: [0.8, 4] } },
  { id: "BW-C", contents: "sea water", density: 1.025, kind: "double-bottom", box: { x: [28, 36], y: [-3, 3], z: [0.05, 1.05] } },
  { id: "GW", contents: "grey water", density: 1, kind: "double-bottom", box: { x: [37, 40], y: [-1.5, 1.5], z: [0.1, 1.1] } },
];
