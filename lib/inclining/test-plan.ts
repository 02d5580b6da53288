/**
 * What is laid down before and during a test: stations, weights, moves. Metres, tonnes; the frame of `lib/frame.ts`.
 * The record's plan has these shapes, so a record can be handed to the method as it is.
 */
export type Place = readonly [x: number, y: number, z: number];

type Mounted = { readonly id: string; readonly x?: number /** its batten increases to port */; readonly reversed?: boolean };

/** length: pivot to the batten's face; a series may carry its own */
export type Pendulum = Mounted & {
  readonly instrument: "pendulum";
  readonly length: number;
  readonly series?: readonly { readonly no: number; readonly length?: number }[];
};

/** span: athwartships distance between the legs; a series may carry its own */
export type UTube = Mounted & {
  readonly instrument: "u-tube";
  readonly span: number;
  readonly series?: readonly { readonly no: number; readonly span?: number }[];
};

export type Inclinometer = Mounted & { readonly instrument: "inclinometer"; readonly series?: readonly { readonly no: number }[] };

export type Station = Pendulum | UTube | Inclinometer;

export type TestWeight = { readonly id: string; readonly mass: number };

/** One entry per run of a move; every weight's centre as measured at that run. Move 0 is the reference. */
export type Move = {
  readonly no: number;
  readonly session?: number;
  readonly repeat?: number;
  readonly excluded?: string;
  readonly positions: Readonly<Record<string, Place>>;
};

/** Persons and their like: aboard while the drafts were read, during the moves, or both (where left out). */
export type Aboard = {
  readonly label: string;
  readonly mass: number;
  readonly x: number;
  readonly y: number;
  readonly z: number;
  readonly during?: "drafts" | "moves" | "both";
};
