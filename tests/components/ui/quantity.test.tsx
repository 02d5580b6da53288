import { cleanup, render } from "@testing-library/react";
import { afterEach, describe, expect, test } from "vitest";
import { Quantity } from "@/components/ui/quantity";

afterEach(cleanup);

function shown(element: React.ReactElement): string {
  return render(element).container.textContent ?? "";
}

describe("a quantity on the page", () => {
  test("has the digits that leave two of its uncertainty", () => {
    expect(shown(<Quantity value={4.76543} unit="m" uncertainty={0.0123} />)).toBe("4.765 m");
    expect(shown(<Quantity value={1473.42} unit="t" uncertainty={4.2} />)).toBe("1473.4 t");
    expect(shown(<Quantity value={1473.42} unit="t" uncertainty={42} />)).toBe("1473 t");
  });

  test("writes a real minus, and never a minus zero", () => {
    expect(shown(<Quantity value={-0.42} unit="m" decimals={2} />)).toBe("−0.42 m");
    expect(shown(<Quantity value={-0.0004} unit="m" decimals={2} />)).toBe("0.00 m");
  });

  test("shows a sign on what can lie to either side", () => {
    expect(shown(<Quantity value={0.42} unit="m" decimals={2} signed />)).toBe("+0.42 m");
  });

  test("says in words that a value is not known", () => {
    expect(shown(<Quantity value={null} unit="m" decimals={2} />)).toContain("not known");
  });
});
