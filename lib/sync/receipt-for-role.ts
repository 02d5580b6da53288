import type { Role } from "./job-sheet";
import type { Receipt } from "./protocol";

const seesEverybody: readonly Role[] = ["lead", "engineer", "witness"];

/** A receipt as its device may hear it: `disagrees` would tell a reader that somebody else read otherwise. */
export function receiptForRole(receipt: Receipt, roles: readonly Role[]): Receipt {
  if (receipt.outcome !== "disagrees" || roles.some((role) => seesEverybody.includes(role))) return receipt;
  return { ...receipt, outcome: "applied" };
}
