/** What was read during a test. Metres and t/m³; millimetres and degrees only where the name says so. */
export type Source = "station" | "radio" | "paper";
export type Status = "accepted" | "superseded" | "void" | "disagrees" | "quarantined";
export type Round = "before" | "after";

/** Where left out: read at the station itself, and accepted. */
export type Provenance = { readonly source?: Source; readonly status?: Status };

type BattenPlace = Provenance & {
  readonly id: string;
  readonly move: number;
  readonly station: string;
  readonly series?: number;
  readonly repeat?: number;
  readonly session?: number;
};

export type BattenMode = "settled" | "turning-points";
export type BattenValue =
  | { readonly mode: BattenMode; readonly valuesMm: readonly number[] }
  | { readonly mode: BattenMode; readonly portMm: readonly number[]; readonly starboardMm: readonly number[] }
  | { readonly mode: BattenMode; readonly valuesDegrees: readonly number[] };

export type BattenReading = BattenPlace & BattenValue;

export type MarkReading = Provenance & {
  readonly id: string;
  readonly mark: string;
  readonly round: Round;
  readonly value: number;
  readonly estimates?: readonly number[];
};

/** A round, or the move at which ballast used as the shifting weight was sounded. */
export type SoundingReading = Provenance & {
  readonly id: string;
  readonly tank: string;
  readonly round?: Round;
  readonly move?: number;
  readonly value: number;
};

export type WaterReading = Provenance & {
  readonly id: string;
  readonly place: string;
  readonly depth: number;
  readonly round?: Round;
  readonly density: number;
  readonly hydrometer?: string;
};

export type TestReadings = {
  readonly battens: readonly BattenReading[];
  readonly drafts: readonly MarkReading[];
  readonly freeboards?: readonly MarkReading[];
  readonly soundings: readonly SoundingReading[];
  readonly water: readonly WaterReading[];
};
