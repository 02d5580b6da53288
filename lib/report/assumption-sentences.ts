import type { IncliningTestData } from "@/lib/inclining/test-data";
import type { IncliningResult } from "@/lib/lightship/inclining-result";
import type { Stating } from "@/lib/lightship/lightship-interval";
import { assumedUncertainty } from "@/lib/lightship/stated-uncertainty";
import { figure, shortFigure } from "./rounding";

/** What a result takes for granted that the test does not say, one sentence each. */
export function assumptionSentences(test: Stating & Weighing, { waterline }: IncliningResult): readonly string[] {
  return [
    ...(test.uncertainty === undefined ? [uncertaintiesAssumed()] : []),
    ...sagAssumed(waterline.sag),
    ...(test.settings?.weights === "readings" ? [readingsWeighed] : []),
    "Errors in the places of the test weights count athwartships only.",
  ];
}

type Weighing = { readonly settings?: Pick<NonNullable<IncliningTestData["settings"]>, "weights"> };

const readingsWeighed =
  "Each reading counts in the line by how well it is known by itself: gusts that moved all stations alike have no part in the weights.";

// below a millimetre the tenth of it is nothing
function sagAssumed(sag: number): string[] {
  if (sag === 0) return ["The hull is taken as straight: the marks do not tell a sag."];
  if (Math.abs(sag) < 0.001) return [];
  const tenth = figure(Math.abs(sag) * 100, 1);
  return [`KM takes mass and buoyancy to share one mean deflection: an error of about a tenth of the sag, ${tenth} mm.`];
}

function uncertaintiesAssumed(): string {
  const of = assumedUncertainty;
  const millimetres = (metres: number) => `${shortFigure(1000 * metres)} mm`;
  const percent = (share: number) => `${shortFigure(100 * share)} %`;
  const said = [
    `${percent(of.weightRelative)} of each weight`,
    `${millimetres(of.distance)} of each place`,
    `${millimetres(of.length)} of each length`,
    `${shortFigure(of.readingMm)} mm or ${shortFigure(of.readingDegrees)}° of each reading of a station`,
    `${millimetres(of.draft)} of each draft and ${millimetres(of.markZero)} of each mark`,
    `${shortFigure(of.density)} t/m³ of each water sample`,
    `${percent(of.itemMassRelative)} and ${shortFigure(of.itemPosition)} m of each item and person`,
    `${millimetres(of.sounding)} of each sounding`,
    `${percent(of.tankVolumeRelative)} of each tank's table and ${shortFigure(of.liquidDensity)} t/m³ of each liquid`,
    `${percent(of.volumeRelative)} of the volume and ${millimetres(of.kmt)} of the metacentre`,
  ];
  return `The test states no uncertainties; taken are standard uncertainties of ${said.join(", ")}.`;
}
