import { expect, test } from "vitest";
import { ledgerOf } from "@/db/server/ledger-entries";
import { recordOf } from "@/db/server/record-as-it-stands";
import { planOf, planRecord } from "@/db/server/test-plan";
import { saveExpected, saveSettings } from "@/db/server/test-settings";
import { promised } from "@/lib/result";
import { at, plan, yard } from "./yard";

const chosen = { method: "generalised" as const, weights: "readings" as const, limits: { straightness: 0.01 } };

test("changes what is chosen for the test, keeps its seed and draws, leaves the rest of the plan, and stands in the ledger", () => {
  const { db, test: id, engineer } = yard();
  promised(saveSettings(db, id, chosen, { by: engineer.id, at }));
  const { method: _, weights: __, agreement: ___, limits: ____, ...kept } = plan.settings ?? {};
  const settings = { ...kept, ...chosen };
  expect(planOf(planRecord(db, id))).toEqual({ ...plan, settings });
  expect(recordOf(db, id).settings).toEqual(settings);
  expect(ledgerOf(db, id).at(-1)).toMatchObject({
    what: "plan.save",
    who: engineer.id,
    before: { settings: plan.settings ?? null },
    after: { settings },
  });
});

test("goes back to the usual where nothing is chosen any more", () => {
  const { db, test: id, engineer } = yard();
  promised(saveSettings(db, id, chosen, { by: engineer.id, at }));
  promised(saveSettings(db, id, { weights: "readings" }, { by: engineer.id, at }));
  expect(planRecord(db, id).settings).toMatchObject({ weights: "readings" });
  expect(planRecord(db, id).settings).not.toHaveProperty("method");
  expect(planRecord(db, id).settings).not.toHaveProperty("limits");
  promised(saveSettings(db, id, null, { by: engineer.id, at }));
  expect(planRecord(db, id).settings?.weights).toBeUndefined();
});

test("the expected ship is stated and taken back, and leaves what is chosen as it is", () => {
  const { db, engineer, test: id } = yard();
  const act = { by: engineer.id, at };
  promised(saveSettings(db, id, { method: "generalised" }, act));
  const expected = { displacement: 1500, lcg: 24, tcg: 0, vcg: 5.5, density: 1.025 };
  promised(saveExpected(db, id, expected, act));
  expect(planRecord(db, id).settings).toMatchObject({ method: "generalised", expected });
  promised(saveSettings(db, id, null, act));
  expect(planRecord(db, id).settings).toMatchObject({ expected });
  promised(saveExpected(db, id, null, act));
  expect(planRecord(db, id).settings).not.toHaveProperty("expected");
});
