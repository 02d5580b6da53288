import { expect, it } from "vitest";
import { studentT, studentTTwoSided95 } from "@/lib/numerics/student-t";

/**
 * Degrees of freedom, then the values that t stays below with probability 0.95, 0.975 and 0.995.
 * Source: bookdown.org/pingapang9/linear_models_bookdown/appt.html;
 * row 30: ezto.mheducation.com/extMedia/bne/Jaggia_4e/using_r/table/table_2.htm.
 */
const table = [
  [1, 6.314, 12.706, 63.657],
  [2, 2.92, 4.303, 9.925],
  [3, 2.353, 3.182, 5.841],
  [4, 2.132, 2.776, 4.604],
  [5, 2.015, 2.571, 4.032],
  [6, 1.943, 2.447, 3.707],
  [7, 1.895, 2.365, 3.499],
  [8, 1.86, 2.306, 3.355],
  [9, 1.833, 2.262, 3.25],
  [10, 1.812, 2.228, 3.169],
  [12, 1.782, 2.179, 3.055],
  [15, 1.753, 2.131, 2.947],
  [20, 1.725, 2.086, 2.845],
  [22, 1.717, 2.074, 2.819],
  [23, 1.714, 2.069, 2.807],
  [25, 1.708, 2.06, 2.787],
  [30, 1.697, 2.042, 2.75],
] as const;

// the tables are printed to three decimals
const rounding = 0.0005 + 1e-9;

it.each(table)("Student's t of %i degrees of freedom is as tabled", (dof, at95, at975, at995) => {
  expect(Math.abs(studentT(0.95, dof) - at95)).toBeLessThan(rounding);
  expect(Math.abs(studentT(0.975, dof) - at975)).toBeLessThan(rounding);
  expect(Math.abs(studentT(0.995, dof) - at995)).toBeLessThan(rounding);
  expect(studentTTwoSided95(dof)).toBeCloseTo(studentT(0.975, dof), 11);
});
