import { expect, it } from "vitest";
import { checkSource } from "@/lib/report/check-sources";

it("a sister's limits come from the circular on sister ships, an earlier test's from the convention", () => {
  const compared = (kind: "earlier" | "sister") =>
    checkSource({ id: "previous-displacement", verdict: "met", found: { kind, deviation: 0, other: 1000 }, limit: { share: 0.02 } });
  expect(compared("sister")).toContain("MSC/Circ.1158");
  expect(compared("earlier")).toContain("SOLAS II-1/5.5");
});
