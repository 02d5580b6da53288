import { expect, it } from "vitest";
import { metOrAttention, metOrNot } from "@/lib/inclining/checks/finding";

it("a limit that a standard sets is met or not, one of our own is met or to be looked at", () => {
  expect([metOrNot(true), metOrNot(false)]).toEqual(["met", "not-met"]);
  expect([metOrAttention(true), metOrAttention(false)]).toEqual(["met", "attention"]);
});
