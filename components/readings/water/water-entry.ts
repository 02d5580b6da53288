import { typedNumber, typedText } from "@/components/ui/typed-number";
import { answer, type Result, refuse } from "@/lib/result";

export type WaterField = "density" | "temperature";
export type WaterEntry = {
  readonly field: WaterField;
  readonly density: string;
  readonly temperature: string;
  readonly hydrometer: string | null;
};
export type WaterValue = { readonly density: number; readonly hydrometer?: string; readonly temperature?: number };
export type WaterRefusal =
  | { readonly type: "NothingTyped" }
  | { readonly type: "NoHydrometer" }
  | { readonly type: "NotWater"; readonly density: number; readonly from: number; readonly to: number }
  | { readonly type: "NotLiquid"; readonly temperature: number; readonly from: number; readonly to: number };

/** From fresh water at 40 °C to the saltiest harbours, with room [t/m³]. *common practice* */
const densities = { from: 0.98, to: 1.05 };
const temperatures = { from: -3, to: 45 };

export function emptyWater(hydrometers: readonly string[]): WaterEntry {
  return { field: "density", density: "", temperature: "", hydrometer: hydrometers.length === 1 ? (hydrometers[0] ?? null) : null };
}

/** A sample's density [t/m³] by one of the test's hydrometers, and its temperature [°C] where it was taken. */
export function waterValue(entry: WaterEntry, hydrometers: readonly string[]): Result<WaterValue, WaterRefusal> {
  const density = typedNumber(entry.density);
  const temperature = typedNumber(entry.temperature);
  if (density === null) return refuse({ type: "NothingTyped" });
  if (density < densities.from || density > densities.to) return refuse({ type: "NotWater", density, ...densities });
  if (temperature !== null && (temperature < temperatures.from || temperature > temperatures.to)) {
    return refuse({ type: "NotLiquid", temperature, ...temperatures });
  }
  if (hydrometers.length > 0 && entry.hydrometer === null) return refuse({ type: "NoHydrometer" });
  return answer({
    density,
    ...(entry.hydrometer === null ? {} : { hydrometer: entry.hydrometer }),
    ...(temperature === null ? {} : { temperature }),
  });
}

export function waterSentence(refusal: WaterRefusal): string | null {
  switch (refusal.type) {
    case "NothingTyped":
      return null;
    case "NoHydrometer":
      return "Which hydrometer floats in the sample?";
    case "NotWater":
      return `${typedText(refusal.density)} is no water in t/m³: it lies between ${refusal.from} and ${refusal.to}, as 1.025.`;
    case "NotLiquid":
      return `${typedText(refusal.temperature)} °C: water lies between ${typedText(refusal.from)} and ${refusal.to} °C.`;
  }
}

export function entryOfWater(value: WaterValue): WaterEntry {
  return {
    field: "density",
    density: typedText(value.density),
    temperature: value.temperature === undefined ? "" : typedText(value.temperature),
    hydrometer: value.hydrometer ?? null,
  };
}
