import { expect, test } from "vitest";
import { inOwnUnit, unitWritten } from "@/lib/vessel/units";

test("brings feet, inches, long tons and litres into metres, tonnes and cubic metres", () => {
  expect(inOwnUnit(10, "length", "ft", 1)).toBe(3.048);
  expect(inOwnUnit(3.5, "length", "in", 1)).toBe(0.0889);
  expect(inOwnUnit(2005, "length", "mm", 1)).toBe(2.005);
  // 2240 lb of 0.45359237 kg
  expect(inOwnUnit(1000, "mass", "long tons", 1)).toBe(1016.0469088);
  expect(inOwnUnit(1234.5, "volume", "litres", 1)).toBe(1.2345);
});

test("a long ton of salt water fills 35 cubic feet, as the trade has always counted", () => {
  // 35 ft³ is the round figure for 1.025 t/m³: within 0.1 %. Source: common practice
  expect(inOwnUnit(1, "volume", "long tons", 1.025) / inOwnUnit(35, "volume", "ft³", 1)).toBeCloseTo(1, 3);
});

test("finds the waterplane from tonnes per centimetre and from tons per inch", () => {
  expect(inOwnUnit(7.38, "area", "t/cm", 1.025)).toBe(720);
  // in salt water TPI = A_W/420 with A_W in ft². Source: common practice, 12 inches × 35 ft³ per ton
  expect(inOwnUnit(1, "area", "long tons/in", 1.025) / inOwnUnit(420, "area", "ft²", 1)).toBeCloseTo(1, 2);
});

test("knows a unit by several ways of writing it, for the quantity that has it only", () => {
  expect([unitWritten("volume", "cu.ft"), unitWritten("length", " MM "), unitWritten("length", "m2"), unitWritten("volume", "MT")]).toEqual(
    ["ft³", "mm", null, "t"],
  );
  expect(() => inOwnUnit(1, "length", "t", 1)).toThrow("t is no unit of length");
});
