import { placeInTable, valueAt } from "@/lib/numerics/interpolation";
import { mean, standardDeviation } from "@/lib/numerics/sum";
import { answer, type Result, refuse } from "@/lib/result";

export type DraftMark = {
  readonly id: string;
  readonly x: number;
  readonly y: number;
  /** height of the mark's zero above the baseline; negative where it counts from the underside of the keel plate */
  readonly zero: number;
  /** raked or curved marks: [reading, x, y, z] */
  readonly table?: readonly (readonly [number, number, number, number])[];
};

/** A place on the deck edge from which the freeboard is measured. */
export type FreeboardMark = { readonly id: string; readonly x: number; readonly y: number; readonly deckEdge: number };

/** A reading of a mark [m]; several estimates in a seaway count by their mean. */
export type MarkReading = { readonly mark: string; readonly value: number; readonly estimates?: readonly number[] };

/** Where the water touched the hull. */
export type MarkPoint = {
  readonly mark: string;
  readonly x: number;
  readonly y: number;
  readonly z: number;
  /** standard uncertainty of the mean of the estimates [m]; null with fewer than two */
  readonly scatter: number | null;
};

export type MarkRefusal =
  | { readonly type: "UnknownMark"; readonly mark: string }
  | { readonly type: "MarkReadTwice"; readonly mark: string }
  | {
      readonly type: "OutsideMarkTable";
      readonly mark: string;
      readonly value: number;
      readonly lowest: number;
      readonly highest: number;
    };

type Read = {
  readonly draftMarks: readonly DraftMark[];
  readonly freeboardMarks?: readonly FreeboardMark[];
  readonly drafts: readonly MarkReading[];
  readonly freeboards?: readonly MarkReading[];
};

/**
 * The points on the hull at which the water stood.
 *
 * A draft mark: z = zero + reading, or the point that its table gives; a freeboard: z = deck edge − reading.
 * Refuses a reading without its mark, a second reading of one mark, a reading outside a raked mark's table.
 */
export function markPoints({ draftMarks, freeboardMarks = [], drafts, freeboards = [] }: Read): Result<readonly MarkPoint[], MarkRefusal> {
  const names = [...drafts, ...freeboards].map(({ mark }) => mark);
  const twice = names.find((mark, i) => names.indexOf(mark) < i);
  if (twice !== undefined) return refuse({ type: "MarkReadTwice", mark: twice });

  const points: MarkPoint[] = [];
  for (const reading of drafts) {
    const mark = draftMarks.find(({ id }) => id === reading.mark);
    const point = mark ? pointOfDraft(mark, reading) : refuse({ type: "UnknownMark" as const, mark: reading.mark });
    if (!point.ok) return point;
    points.push(point.value);
  }
  for (const reading of freeboards) {
    const mark = freeboardMarks.find(({ id }) => id === reading.mark);
    if (!mark) return refuse({ type: "UnknownMark", mark: reading.mark });
    points.push({ mark: mark.id, x: mark.x, y: mark.y, z: mark.deckEdge - valueOfReading(reading), scatter: scatterOf(reading) });
  }
  return answer(points);
}

function pointOfDraft(mark: DraftMark, reading: MarkReading): Result<MarkPoint, MarkRefusal> {
  const value = valueOfReading(reading);
  const scatter = scatterOf(reading);
  if (!mark.table) return answer({ mark: mark.id, x: mark.x, y: mark.y, z: mark.zero + value, scatter });
  const rows = [...mark.table].sort((a, b) => a[0] - b[0]);
  const column = (i: 0 | 1 | 2 | 3) => rows.map((row) => row[i]);
  const place = placeInTable(column(0), value);
  if (!place.ok) return refuse({ ...place.refusal, type: "OutsideMarkTable", mark: mark.id });
  const [x, y, z] = [valueAt(column(1), place.value), valueAt(column(2), place.value), valueAt(column(3), place.value)];
  return answer({ mark: mark.id, x, y, z, scatter });
}

function valueOfReading({ value, estimates = [] }: MarkReading): number {
  return estimates.length > 0 ? mean(estimates) : value;
}

function scatterOf({ estimates = [] }: MarkReading): number | null {
  return estimates.length > 1 ? standardDeviation(estimates) / Math.sqrt(estimates.length) : null;
}
