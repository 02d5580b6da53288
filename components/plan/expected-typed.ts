import { z } from "zod";
import { numberSchema } from "@/components/ui/number-schema";
import { typedText } from "@/components/ui/typed-number";
import type { TestSettings } from "@/lib/record/settings-schema";

export type ExpectedShip = NonNullable<TestSettings["expected"]>;
type Key = keyof ExpectedShip;

export const expectedFields: readonly { readonly key: Key; readonly label: string; readonly unit: string }[] = [
  { key: "displacement", label: "Displacement during the test", unit: "t" },
  { key: "vcg", label: "KG, liquids free", unit: "m" },
  { key: "lcg", label: "LCG forward of AP", unit: "m" },
  { key: "tcg", label: "TCG, to starboard", unit: "m" },
  { key: "density", label: "Density of the water", unit: "t/m³" },
];

const positive = (sense: string) => numberSchema({ least: Number.MIN_VALUE, sense });

/** The form's schema: the text of each field becomes a number of the record. */
export const expectedSchema = z.object({
  displacement: positive("A displacement is above 0."),
  vcg: numberSchema(),
  lcg: numberSchema(),
  tcg: numberSchema(),
  density: numberSchema({ least: 0.95, most: 1.1, sense: "Water has from 0.95 to 1.1 t/m³." }),
});
export type ExpectedTyped = Record<Key, string>;

export function typedExpected(expected: ExpectedShip | undefined): ExpectedTyped {
  if (!expected) return { displacement: "", vcg: "", lcg: "", tcg: "0", density: "1.025" };
  const { displacement, vcg, lcg, tcg, density } = expected;
  return {
    displacement: typedText(displacement),
    vcg: typedText(vcg),
    lcg: typedText(lcg),
    tcg: typedText(tcg),
    density: typedText(density),
  };
}
