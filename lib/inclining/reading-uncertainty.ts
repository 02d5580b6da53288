/** Standard uncertainty of one resting point: of a batten or a leg [mm], of an inclinometer [degrees]. */
export type ReadingUncertainty = { readonly readingMm: number; readonly readingDegrees: number };

/** The program's own assumption where a test states nothing about its uncertainties: *common practice*. */
export const assumedReadingUncertainty: ReadingUncertainty = { readingMm: 0.5, readingDegrees: 0.01 };

/** As the test states it: a key left out is zero; nothing stated at all is the program's assumption. */
export function readingUncertaintyOf(stated: Partial<ReadingUncertainty> | undefined): ReadingUncertainty {
  if (stated === undefined) return assumedReadingUncertainty;
  return { readingMm: stated.readingMm ?? 0, readingDegrees: stated.readingDegrees ?? 0 };
}
