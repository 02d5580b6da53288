import Module from "manifold-3d";
import type { Waterplane } from "@/lib/frame";
import type { Offsets } from "@/lib/hydrostatics/hull";

/** A hull as a general-purpose solid of triangles, to be cut by a plane: the same sections, straight between them. */
export async function solidHull({ sections }: Pick<Offsets, "sections">): Promise<{ readonly volumeBelow: (plane: Waterplane) => number }> {
  const wasm = await Module();
  wasm.setup();
  const rings = sections.map(({ x, points }) => ringAt(x, points));
  const size = rings[0]?.length ?? 0;
  if (rings.some((ring) => ring.length !== size)) throw new Error("the bench needs sections with one number of points");
  const vertices = rings.flat(2);
  const triangles = [...sidesOf(rings.length, size), ...capOf(0, size, false), ...capOf(rings.length - 1, size, true)];
  const mesh = new wasm.Mesh({ numProp: 3, vertProperties: Float32Array.from(vertices), triVerts: Uint32Array.from(triangles) });
  mesh.merge();
  const solid = new wasm.Manifold(mesh);
  return {
    volumeBelow: ({ draftAtAp, slopeAlong, tanHeel }) => {
      // keeps what lies below z = a + b·x + c·y
      const below = solid.trimByPlane([slopeAlong, tanHeel, -1], -draftAtAp);
      const volume = below.volume();
      below.delete();
      return volume;
    },
  };
}

/** Starboard from keel to deck, then port from deck to keel. */
function ringAt(x: number, points: readonly (readonly [number, number])[]): [number, number, number][] {
  const starboard = points.map(([y, z]): [number, number, number] => [x, y, z]);
  return [...starboard, ...starboard.toReversed().map(([, y, z]): [number, number, number] => [x, -y, z])];
}

function sidesOf(rings: number, size: number): number[] {
  return Array.from({ length: rings - 1 }, (_, k) =>
    Array.from({ length: size }, (_, i) => {
      const [a, b] = [k * size + i, k * size + ((i + 1) % size)];
      return [a, b, b + size, a, b + size, a + size];
    }),
  ).flat(2);
}

function capOf(ring: number, size: number, isForward: boolean): number[] {
  const first = ring * size;
  return Array.from({ length: size - 2 }, (_, i) => {
    const [a, b, c] = [first, first + i + 1, first + i + 2];
    return isForward ? [a, b, c] : [a, c, b];
  }).flat();
}
