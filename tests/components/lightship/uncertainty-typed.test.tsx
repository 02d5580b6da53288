import { expect, test } from "vitest";
import { typedUncertainty, uncertaintyFields, uncertaintySchema } from "@/components/lightship/uncertainty-typed";
import { assumedUncertainty } from "@/lib/lightship/stated-uncertainty";

test("shows what is assumed, in millimetres and percent, and gives the same numbers back", () => {
  const typed = typedUncertainty(undefined);
  expect(typed).toMatchObject({ weightRelative: "0.1", draft: "5", density: "0.5", itemPosition: "0.1" });
  const read = uncertaintySchema.parse(typed);
  for (const { key } of uncertaintyFields) expect(read[key]).toBeCloseTo(assumedUncertainty[key], 12);
});

test("has a field for every uncertainty", () => {
  expect(uncertaintyFields.map(({ key }) => key).sort()).toEqual(Object.keys(assumedUncertainty).sort());
});

test("takes a comma, and refuses a negative number with a sentence", () => {
  expect(uncertaintySchema.parse({ ...typedUncertainty(undefined), draft: "2,5" }).draft).toBeCloseTo(0.0025, 12);
  const refused = uncertaintySchema.safeParse({ ...typedUncertainty(undefined), draft: "-1" });
  expect(refused.error?.issues[0]).toMatchObject({ path: ["draft"], message: "A standard uncertainty is 0 or more." });
});
