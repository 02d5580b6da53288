import { type Waterplane, waterplaneHeight } from "@/lib/frame";
import type { DraftMark, MarkReading } from "@/lib/hydrostatics/mark-point";

/** Six marks of a ship 60 m long and 12 m broad: aft, midships and forward, port and starboard. */
export const sixMarks: readonly DraftMark[] = [
  { id: "AP", x: 1, y: -4, zero: 0 },
  { id: "AS", x: 1, y: 4, zero: 0 },
  { id: "MP", x: 31, y: -6, zero: -0.01 },
  { id: "MS", x: 31, y: 6, zero: -0.01 },
  { id: "FP", x: 57, y: -2, zero: 0 },
  { id: "FS", x: 57, y: 2, zero: 0 },
];

/** What the marks show where the water stands at a plane. */
export function readingsAt(plane: Waterplane, marks: readonly DraftMark[] = sixMarks): readonly MarkReading[] {
  return marks.map(({ id, x, y, zero }) => ({ mark: id, value: waterplaneHeight(plane, x, y) - zero }));
}
