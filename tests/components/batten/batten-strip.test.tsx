import { cleanup, render, screen } from "@testing-library/react";
import { afterEach, describe, expect, test } from "vitest";
import { BattenStrip } from "@/components/batten/batten-strip";

afterEach(cleanup);

const marks = [112, 97, 110].map((value, index) => ({ value, label: String(index + 1) }));
const strip = (zero: number | null, mean: number | null = 104) =>
  render(<BattenStrip unit="mm" marks={marks} mean={mean} zero={zero} span={[80, 120]} />);
const word = (name: string) => screen.queryByText(name);

describe("the batten strip", () => {
  test("says in words what it shows", () => {
    strip(90);
    expect(screen.getByRole("img").getAttribute("aria-label")).toBe("Batten: marks at 112, 97, 110 mm, mean 104 mm, zero at 90 mm");
  });

  test("has port on the left and starboard on the right", () => {
    strip(null);
    const place = (side: string) => Number(word(side)?.getAttribute("x"));
    expect(place("P")).toBeLessThan(place("S"));
  });

  test("shows each number where it stands on the wood", () => {
    const { container } = strip(null);
    const x = (label: string) =>
      Number([...container.querySelectorAll("text")].find((text) => text.textContent === label)?.getAttribute("x"));
    // half way between 97 and 112 lies nearer to 110 than to 97
    expect(x("1") - x("2")).toBeCloseTo((15 / 40) * 328, 6);
    expect(x("1") - x("3")).toBeCloseTo((2 / 40) * 328, 6);
  });

  test("does not draw a zero that lies off the part shown", () => {
    strip(10);
    expect(word("zero")).toBeNull();
  });
});
