import type { Range } from "./finding";

/** What findings are held against. Degrees, metres, millimetres where the name says so, shares of 1. */
export type CheckLimits = {
  readonly heel: Range;
  readonly deflectionMm: number;
  readonly stations: { readonly recommended: number; readonly least: number };
  /** below this length class may accept one station less */
  readonly smallShip: number;
  /** lengths closer than this share are equal */
  readonly equalLengths: number;
  readonly stationSlope: number;
  /** of the largest heel */
  readonly zeroDrift: number;
  readonly movements: { readonly full: number; readonly straight: number };
  /** a straight line looks bent as often as this by chance */
  readonly straightness: number;
  readonly initialList: number;
  readonly trim: number;
  readonly freeboards: number;
  readonly largeShip: number;
  /** of a mark against the waterplane that all marks agree on [m] */
  readonly markError: number;
  readonly draftChange: number;
  readonly soundingChange: number;
  readonly slackGroups: number;
  readonly deepTank: Range;
  readonly doubleBottomTank: Range;
  readonly underKeel: number;
  readonly missing: number;
  readonly surplus: number;
};

/**
 * The limits of a test that sets none of its own. Those that no standard fixes are settings: equal lengths, agreement of
 * stations, drift of zero, straightness, what counts as a large ship, agreement of the marks, changes between rounds, clearance under the keel.
 *
 * Source: `checkSource` of each check.
 */
export const usualLimits: CheckLimits = {
  heel: [1, 4],
  deflectionMm: 150,
  stations: { recommended: 3, least: 2 },
  smallShip: 30,
  equalLengths: 0.02,
  stationSlope: 0.02,
  zeroDrift: 0.02,
  movements: { full: 8, straight: 6 },
  straightness: 0.05,
  initialList: 0.5,
  trim: 0.01,
  freeboards: 5,
  largeShip: 90,
  markError: 0.02,
  draftChange: 0.02,
  soundingChange: 0.01,
  slackGroups: 1,
  deepTank: [0.2, 0.8],
  doubleBottomTank: [0.4, 0.6],
  underKeel: 0.3,
  missing: 0.02,
  surplus: 0.04,
};

/** The limits of a test: its own where it sets them, the usual ones otherwise. */
export function limitsOf({ settings }: Limited): CheckLimits {
  return { ...usualLimits, ...settings?.limits };
}

/** A test that may set limits of its own. */
export type Limited = { readonly settings?: { readonly limits?: Partial<CheckLimits> } };
