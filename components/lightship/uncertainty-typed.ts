import { z } from "zod";
import { numberSchema } from "@/components/ui/number-schema";
import { type StatedUncertainty, statedUncertainty } from "@/lib/lightship/stated-uncertainty";
import { shortFigure } from "@/lib/report/rounding";

type Key = keyof StatedUncertainty;

/** Each standard uncertainty as a person thinks of it: in millimetres and percent. `per`: how many of the unit make one of the record's. */
export const uncertaintyFields: readonly { readonly key: Key; readonly label: string; readonly unit: string; readonly per: number }[] = [
  { key: "weightRelative", label: "Mass of each weight", unit: "%", per: 100 },
  { key: "distance", label: "Each place of a weight, athwart", unit: "mm", per: 1000 },
  { key: "length", label: "Each pendulum length or span", unit: "mm", per: 1000 },
  { key: "readingMm", label: "Each resting point", unit: "mm", per: 1 },
  { key: "readingDegrees", label: "Each inclinometer reading", unit: "°", per: 1 },
  { key: "draft", label: "Each draft or freeboard", unit: "mm", per: 1000 },
  { key: "markZero", label: "Height of each mark", unit: "mm", per: 1000 },
  { key: "density", label: "Each water sample", unit: "kg/m³", per: 1000 },
  { key: "itemMassRelative", label: "Mass of each item and person", unit: "%", per: 100 },
  { key: "itemPosition", label: "Place of each item and person", unit: "m", per: 1 },
  { key: "sounding", label: "Each sounding", unit: "mm", per: 1000 },
  { key: "tankVolumeRelative", label: "Each tank's table", unit: "%", per: 100 },
  { key: "liquidDensity", label: "Density of each liquid", unit: "kg/m³", per: 1000 },
  { key: "volumeRelative", label: "Volume of the hull", unit: "%", per: 100 },
  { key: "kmt", label: "Height of the metacentre", unit: "mm", per: 1000 },
];

const amount = numberSchema({ least: 0, sense: "A standard uncertainty is 0 or more." });

/** The form's schema: the text of each field becomes the number of the record. */
export const uncertaintySchema = z.object(
  Object.fromEntries(uncertaintyFields.map(({ key, per }) => [key, amount.transform((value) => value / per)])) as unknown as Record<
    Key,
    z.ZodType<number, string>
  >,
);
export type UncertaintyTyped = Record<Key, string>;

/** What stands in the fields: what the test states, else what is assumed. */
export function typedUncertainty(stated: Partial<StatedUncertainty> | undefined): UncertaintyTyped {
  const standing = statedUncertainty(stated);
  return Object.fromEntries(uncertaintyFields.map(({ key, per }) => [key, shortFigure(standing[key] * per)])) as UncertaintyTyped;
}
