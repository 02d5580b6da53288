import { expect, test } from "vitest";
import { skerryTern, skerryTernReadings } from "@/db/seed/skerry-tern";
import { defendedLightship } from "@/lib/lightship/defended-lightship";
import { examined } from "@/lib/lightship/examination";
import { incliningResult } from "@/lib/lightship/inclining-result";
import { resultDocument } from "@/lib/report/result-document";
import { asReadResult, resultSchema } from "@/lib/report/result-schema";
import { promised } from "@/lib/result";

test("reads a whole result back as it was written, key for key", () => {
  const tern = { ...skerryTern().record, readings: skerryTernReadings(7), settings: { draws: 2000 } };
  const document = resultDocument(tern, promised(incliningResult(tern)), promised(defendedLightship(tern)), promised(examined(tern)));
  expect(asReadResult(document)).toEqual(document);
  const { assumptions, ...without } = document;
  expect(resultSchema.safeParse(without).success).toBe(false);
  expect(resultSchema.safeParse({ ...document, more: 1 }).success).toBe(false);
});
