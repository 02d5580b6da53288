import { describe, expect, test } from "vitest";
import { emptyWater, entryOfWater, type WaterEntry, waterSentence, waterValue } from "@/components/readings/water/water-entry";

const hydrometers = ["H1", "H2"];
const sample = (change: Partial<WaterEntry>): WaterEntry => ({
  ...emptyWater(hydrometers),
  density: "1.0232",
  hydrometer: "H1",
  ...change,
});

describe("a sample of water while it is typed", () => {
  test("holds density, hydrometer and temperature", () => {
    const value = { density: 1.0232, hydrometer: "H1", temperature: 11.5 };
    expect(waterValue(sample({ temperature: "11,5" }), hydrometers)).toEqual({ ok: true, value });
    expect(waterValue(entryOfWater(value), hydrometers)).toEqual({ ok: true, value });
  });

  test.each<[string, Partial<WaterEntry>, string]>([
    ["kilograms per cubic metre", { density: "1025" }, "1025 is no water in t/m³: it lies between 0.98 and 1.05, as 1.025."],
    ["a density whose hydrometer is not named", { hydrometer: null }, "Which hydrometer floats in the sample?"],
    ["a temperature in another scale", { temperature: "60" }, "60 °C: water lies between −3 and 45 °C."],
  ])("refuses %s", (_, change, sentence) => {
    const value = waterValue(sample(change), hydrometers);
    expect(value.ok ? null : waterSentence(value.refusal)).toBe(sentence);
  });

  test("needs no choice where there is one hydrometer, and no name where there is none", () => {
    expect(emptyWater(["H1"]).hydrometer).toBe("H1");
    expect(waterValue({ ...emptyWater([]), density: "1" }, [])).toEqual({ ok: true, value: { density: 1 } });
  });
});
