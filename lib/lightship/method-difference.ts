import { type EdgeCrossing, edgesInTheWater } from "@/lib/hydrostatics/edges-in-the-water";
import type { InclinedShip } from "@/lib/inclining/inclining-test";
import { wallSidedBias } from "@/lib/inclining/wall-sided-bias";
import type { LightshipTestData } from "./inclining-result";

/** Why the two reductions give another KG: what is found, and what upright sides explain of it [m, as inclined]. */
export type MethodDifference = {
  /** generalised less classical */
  readonly found: number;
  readonly byWallSides: number;
  /** edges that met the water within the heels of the test */
  readonly edges: readonly EdgeCrossing[];
};

/** The difference between the two reductions and its causes; null where there is only the classical one. */
export function methodDifference(
  test: LightshipTestData,
  { afloat, line, asInclined, generalised }: InclinedShip,
): MethodDifference | null {
  if (generalised === null || test.hydrostatics.kind !== "offsets") return null;
  const { plane } = afloat.waterline;
  const heels = line.moves.map(({ tanHeel }) => plane.tanHeel + tanHeel);
  return {
    found: generalised.vcg - asInclined.vcg,
    byWallSides: wallSidedBias(afloat, line),
    edges: edgesInTheWater(test.hydrostatics, plane, [Math.min(...heels), Math.max(...heels)]),
  };
}
