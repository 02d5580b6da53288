import { cleanup, fireEvent, render, screen } from "@testing-library/react";
import { useState } from "react";
import { afterEach, describe, expect, test, vi } from "vitest";
import { NumberPad } from "@/components/readings/pad/number-pad";
import { typedAfter } from "@/components/readings/pad/typed-keys";

afterEach(cleanup);

function Pad({ signed = true, onNext }: { signed?: boolean; onNext?: () => void }) {
  const [text, setText] = useState("");
  return (
    <>
      <output>{text}</output>
      <NumberPad
        signed={signed}
        onKey={(key) => setText(typedAfter(text, key))}
        {...(onNext ? { next: { label: "Next mark", enabled: text !== "", onNext } } : {})}
      />
    </>
  );
}

const press = (...names: string[]) => {
  for (const name of names) fireEvent.click(screen.getByRole("button", { name }));
};
const typed = () => screen.getByRole("status").textContent;

describe("the number pad", () => {
  test.each(["Decimal comma", "Decimal point"])("types a number by the %s", (mark) => {
    render(<Pad />);
    press("1", "0", "1", mark, "5", "Change sign");
    expect(typed()).toBe(mark === "Decimal comma" ? "−101,5" : "−101.5");
  });

  test("takes the last digit back, and clears", () => {
    render(<Pad />);
    press("1", "2", "Delete the last digit");
    expect(typed()).toBe("1");
    press("3", "Clear");
    expect(typed()).toBe("");
  });

  test("has no sign where the scale has none", () => {
    render(<Pad signed={false} />);
    expect(screen.getByRole("button", { name: "Change sign" })).toHaveProperty("disabled", true);
  });

  test("hears a keyboard that is plugged in, and Enter takes the mark", () => {
    const onNext = vi.fn();
    render(<Pad onNext={onNext} />);
    for (const key of ["1", ",", "5", "-", "Enter"]) fireEvent.keyDown(window, { key });
    expect(typed()).toBe("−1,5");
    expect(onNext).toHaveBeenCalledOnce();
  });

  test("leaves a keyboard alone that writes in a field", () => {
    render(
      <>
        <input aria-label="Note" />
        <Pad />
      </>,
    );
    fireEvent.keyDown(screen.getByLabelText("Note"), { key: "7" });
    expect(typed()).toBe("");
  });
});
