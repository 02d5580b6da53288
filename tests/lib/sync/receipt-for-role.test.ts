import { describe, expect, it } from "vitest";
import { type Role, roleSchema } from "@/lib/sync/job-sheet";
import { outcomeSchema, type Receipt } from "@/lib/sync/protocol";
import { receiptForRole } from "@/lib/sync/receipt-for-role";
import { idOf } from "./sample-acts";

const receipt = (outcome: Receipt["outcome"]): Receipt => ({ id: idOf(1), outcome, serverSeq: 412 });
const heardBy = (roles: readonly Role[]) => receiptForRole(receipt("disagrees"), roles).outcome;

describe("a disagreement", () => {
  it("is never heard by a reader's phone, nor by one of no role: it would tell what somebody else has read", () => {
    const deaf: Role[][] = [["reader"], ["administrator"], ["reader", "administrator"], []];
    expect(deaf.map(heardBy)).toEqual(["applied", "applied", "applied", "applied"]);
  });

  it("is heard by those who see everybody's readings anyhow", () => {
    expect(roleSchema.options.filter((role) => heardBy([role]) === "disagrees")).toEqual(["lead", "engineer", "witness"]);
    expect(heardBy(["reader", "lead"])).toBe("disagrees");
  });

  it("hidden from a reader leaves all else of his receipt as it was", () => {
    expect(receiptForRole(receipt("disagrees"), ["reader"])).toEqual(receipt("applied"));
  });
});

describe("every other outcome", () => {
  it("is heard by everybody as it is, with its code and its sentence", () => {
    for (const outcome of outcomeSchema.options.filter((each) => each !== "disagrees")) {
      expect(receiptForRole(receipt(outcome), ["reader"])).toEqual(receipt(outcome));
    }
    const aside: Receipt = { ...receipt("quarantined"), code: "unknown-slot", message: "The plan has no such reading due" };
    expect(receiptForRole(aside, ["reader"])).toEqual(aside);
  });
});
