import { cleanup, fireEvent, render, screen } from "@testing-library/react";
import { afterEach, describe, expect, test, vi } from "vitest";
import { SaveBar } from "@/components/readings/task/save-bar";

afterEach(cleanup);

const bar = (secondLook: string | null, onSave = vi.fn()) => ({
  onSave,
  ...render(<SaveBar refusal={null} ready secondLook={secondLook} saving={false} onSave={onSave} />),
});
const press = () => fireEvent.click(screen.getByRole("button"));

describe("save", () => {
  test("saves at once where nothing stands out", () => {
    const { onSave } = bar(null);
    press();
    expect(onSave).toHaveBeenCalledOnce();
  });

  test("asks once to look again, then takes the reader's word", () => {
    const { onSave } = bar("1015 mm is far from the rest.");
    press();
    expect(onSave).not.toHaveBeenCalled();
    expect(screen.getByRole("status").textContent).toBe("Look again. 1015 mm is far from the rest.");
    press();
    expect(onSave).toHaveBeenCalledOnce();
  });

  test("asks again when the number has changed meanwhile", () => {
    const { onSave, rerender } = bar("1015 mm is far from the rest.");
    press();
    rerender(<SaveBar refusal={null} ready secondLook="1016 mm is far from the rest." saving={false} onSave={onSave} />);
    press();
    expect(onSave).not.toHaveBeenCalled();
  });

  test("cannot be pressed while the reading is refused", () => {
    render(<SaveBar refusal="900 mm is not on this scale." ready={false} secondLook={null} saving={false} onSave={vi.fn()} />);
    expect(screen.getByRole("button")).toHaveProperty("disabled", true);
    expect(screen.getByRole("status").textContent).toBe("900 mm is not on this scale.");
  });
});
