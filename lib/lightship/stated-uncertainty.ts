/** Standard uncertainties of what goes into a test; what each stands for: see `uncertainInputs`. */
export type StatedUncertainty = {
  /** of each weight's mass, relative */
  readonly weightRelative: number;
  /** of each place athwartships in which a weight's centre stands [m] */
  readonly distance: number;
  /** of each pendulum or span [m] */
  readonly length: number;
  readonly readingMm: number;
  readonly readingDegrees: number;
  /** of each mark or freeboard reading [m] */
  readonly draft: number;
  /** of each mark's zero [m] */
  readonly markZero: number;
  /** of each sample [t/m³] */
  readonly density: number;
  /** of each item and each entry of persons aboard */
  readonly itemMassRelative: number;
  readonly itemPosition: number;
  /** of each sounding [m] */
  readonly sounding: number;
  /** of each tank's table */
  readonly tankVolumeRelative: number;
  /** of each liquid [t/m³] */
  readonly liquidDensity: number;
  /** of the hydrostatics as a whole: volume, relative; KM [m] */
  readonly volumeRelative: number;
  readonly kmt: number;
};

/** The program's own assumptions where a test states nothing about its uncertainties: *common practice*. */
export const assumedUncertainty: StatedUncertainty = {
  weightRelative: 0.001,
  distance: 0.005,
  length: 0.002,
  readingMm: 0.5,
  readingDegrees: 0.01,
  draft: 0.005,
  markZero: 0.002,
  density: 0.0005,
  itemMassRelative: 0.05,
  itemPosition: 0.1,
  sounding: 0.005,
  tankVolumeRelative: 0.01,
  liquidDensity: 0.005,
  volumeRelative: 0.002,
  kmt: 0.005,
};

const nothingStated = Object.fromEntries(Object.keys(assumedUncertainty).map((key) => [key, 0])) as StatedUncertainty;

/** As the test states it: a key left out is zero; nothing stated at all is the program's assumption. */
export function statedUncertainty(stated: Partial<StatedUncertainty> | undefined): StatedUncertainty {
  return stated === undefined ? assumedUncertainty : { ...nothingStated, ...stated };
}
