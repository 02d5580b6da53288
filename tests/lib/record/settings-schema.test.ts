import { expect, it } from "vitest";
import { limitsOf, usualLimits } from "@/lib/inclining/checks/check-limits";
import { faultsOf } from "@/lib/inclining/faults";
import { examined } from "@/lib/lightship/examination";
import { recordFrom } from "@/lib/record/parse-record";
import { settingsSchema } from "@/lib/record/settings-schema";
import type { TestRecord } from "@/lib/record/test-record";
import { refusalLine } from "@/lib/report/refusal-sentence";
import { promised } from "@/lib/result";
import { documentWith, sampleDocument } from "./sample-document";

const withSettings = (settings: unknown) => recordFrom(documentWith(["settings"], settings));

it("a record knows a limit for every one that the checks have, and takes the usual ones as they are", () => {
  const limits = settingsSchema.parse({ limits: usualLimits }).limits;
  expect(limits).toEqual(usualLimits);
  expect(Object.keys(settingsSchema.shape.limits.unwrap().shape).sort()).toEqual(Object.keys(usualLimits).sort());
});

it("a record from before these keys, or without any settings, is reduced as before by the usual limits", () => {
  const { settings: _, ...old } = sampleDocument();
  const read = promised(recordFrom(old));
  expect(limitsOf(read)).toEqual(usualLimits);
  expect(promised(withSettings({ method: "generalised", seed: 4, draws: 1000 })).settings).toEqual({
    method: "generalised",
    seed: 4,
    draws: 1000,
  });
});

it("a limit that the test sets takes the place of the usual one, alone, and its finding says so", () => {
  const record = promised(withSettings({ limits: { straightness: 0.01, heel: [2.6, 4] } })) as TestRecord;
  const { checks } = promised(examined(record));
  expect(checks.find(({ id }) => id === "straightness")).toMatchObject({ limit: { probability: 0.01 }, isSetForTest: true });
  // the sample heels 2.4° to each side
  expect(checks.find(({ id }) => id === "heel-range")).toMatchObject({ verdict: "not-met", isSetForTest: true });
  expect(checks.find(({ id }) => id === "initial-list")).toMatchObject({ limit: { most: usualLimits.initialList } });
  expect(checks.filter(({ isSetForTest }) => isSetForTest)).toHaveLength(2);
});

it("a limit that is none is refused with its place", () => {
  const lines = (settings: unknown) => faultsOf(withSettings(settings)).map(refusalLine);
  expect(lines({ limits: { heel: [4, 1] } })[0]).toMatch(/^settings\.limits\.heel: a lower limit below the upper one needed/);
  expect(lines({ limits: { straightness: 1.5 } })).toEqual(["settings.limits.straightness: a number below 1 needed, 1.5 given"]);
  expect(lines({ limits: { colour: 1 } })).toEqual(['settings.limits.colour: unknown key "colour"']);
  expect(lines({ weights: "heavy" })).toEqual(['settings.weights: "equal" or "readings" needed, "heavy" given']);
});
