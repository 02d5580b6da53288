import { expect, test } from "vitest";
import { type AlongFrom, type Field, usualReading, valueInFrame } from "@/lib/vessel/sheet-field";

const field = (axis: Field["axis"]): Field => ({ key: "k", label: "k", quantity: "length", headings: /./, ...(axis ? { axis } : {}) });

test.each<[AlongFrom, number, number]>([
  ["ap", 24.7, 24.7],
  ["midships-forward", -2.3, 24.7],
  ["midships-aft", 2.3, 24.7],
  ["fp-aft", 29.3, 24.7],
])("counts x from %s: %d is %d forward of AP", (alongFrom, given, x) => {
  expect(valueInFrame(given, field("along"), "m", { ...usualReading(54), alongFrom })).toBe(x);
});

test("turns breadths to port and trims by the bow, and nothing else", () => {
  const reading = { ...usualReading(54), athwart: "port", trimBy: "bow" } as const;
  expect(["athwart", "trim", undefined].map((axis) => valueInFrame(1.5, field(axis as Field["axis"]), "m", reading))).toEqual([
    -1.5, -1.5, 1.5,
  ]);
  expect(Object.is(valueInFrame(0, field("athwart"), "m", reading), 0)).toBe(true);
});
