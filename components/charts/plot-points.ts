/** One resting point in the plot: its tangent is measured from its own station's intercept, so that all lie about one line. */
export type PlotPoint = {
  readonly station: string;
  readonly move: number;
  /** t·m, positive to starboard */
  readonly moment: number;
  /** mm per m */
  readonly tangent: number;
  /** measured − the common line, mm per m */
  readonly residual: number;
  /** why the point takes no part: drawn hollow; null where it counts */
  readonly leftOut: string | null;
};

/** The common line through every station's intercept, mm per m on t·m. */
export type PlotLine = { readonly slope: number };

/** A point's name for eyes and ears: "station B, move 3". */
export function pointName(point: PlotPoint): string {
  return `station ${point.station}, move ${point.move}`;
}

/** Points from port to starboard, so that arrow keys walk along the line. */
export function alongTheLine(points: readonly PlotPoint[]): PlotPoint[] {
  return [...points].sort((one, other) => one.moment - other.moment || one.move - other.move || one.station.localeCompare(other.station));
}
