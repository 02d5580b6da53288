import { describe, expect, it } from "vitest";
import { faultsOf, gathered, inside, refuseFaults } from "@/lib/inclining/faults";
import { answer, refuse } from "@/lib/result";

describe("faults", () => {
  it("gather every answer, or every refusal", () => {
    expect(gathered([answer(1), answer(2)])).toEqual(answer([1, 2]));
    expect(gathered([answer(1), refuse({ type: "A" }), refuseFaults([{ type: "B" }, { type: "C" }])])).toEqual(
      refuseFaults([{ type: "A" }, { type: "B" }, { type: "C" }]),
    );
  });

  it("take their place inside a part of the record", () => {
    const placed = inside(
      "stations[2]",
      refuseFaults([{ type: "A", path: "series[0].length" }, { type: "B" }, { type: "C", path: "[1]" }]),
    );
    expect(faultsOf(placed).map(({ path }) => path)).toEqual(["stations[2].series[0].length", "stations[2]", "stations[2][1]"]);
    expect(inside("stations[2]", answer(1))).toEqual(answer(1));
  });
});
