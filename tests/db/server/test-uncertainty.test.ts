import { expect, test } from "vitest";
import { ledgerOf } from "@/db/server/ledger-entries";
import { planOf, planRecord } from "@/db/server/test-plan";
import { saveUncertainty } from "@/db/server/test-uncertainty";
import { promised } from "@/lib/result";
import { at, plan, yard } from "./yard";

test("changes what the test states of its uncertainties, leaves the rest of the plan, and stands in the ledger", () => {
  const { db, test: id, engineer } = yard();
  promised(saveUncertainty(db, id, { draft: 0.003 }, { by: engineer.id, at }));
  expect(planOf(planRecord(db, id))).toEqual({ ...plan, uncertainty: { draft: 0.003 } });
  expect(ledgerOf(db, id).at(-1)).toMatchObject({
    what: "plan.save",
    before: { uncertainty: plan.uncertainty },
    after: { uncertainty: { draft: 0.003 } },
  });
});

test("takes the statement back", () => {
  const { db, test: id, engineer } = yard();
  promised(saveUncertainty(db, id, null, { by: engineer.id, at }));
  expect(planRecord(db, id).uncertainty).toBeUndefined();
});
