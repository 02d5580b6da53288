import { expect, test } from "vitest";
import { type ShiftTyped, solvedTerm } from "@/components/plan/shift-terms";

const nothing: ShiftTyped = { weight: "", distance: "", tanHeel: "", length: "", deflection: "", displacement: "", gmFluid: "" };
// 10 t over 8 m in a ship of 2000 t with GM 1 m: tan = 80/2000 = 0.04, 2.29°, 160 mm on 4 m
const shift: ShiftTyped = {
  weight: "10",
  distance: "8",
  tanHeel: "2.2906",
  length: "4",
  deflection: "160",
  displacement: "2000",
  gmFluid: "1",
};

test.each([
  ["weight", "10.00"],
  ["distance", "8.00"],
  ["tanHeel", "2.29"],
  ["length", "4.00"],
  ["deflection", "160"],
  ["displacement", "2000.0"],
  ["gmFluid", "1.000"],
] as const)("%s follows from the others", (wanted, figure) => {
  expect(solvedTerm(wanted, shift)).toEqual({ figure });
});

test("the heel counts by deflection and length where no angle is typed, with a comma as with a point", () => {
  expect(solvedTerm("gmFluid", { ...shift, tanHeel: "", length: "4,0" })).toEqual({ figure: "1.000" });
});

test("what is missing is said in a sentence", () => {
  expect(solvedTerm("weight", nothing)).toEqual({ sentence: expect.stringMatching(/the weight needs the .*GM/i) });
});
