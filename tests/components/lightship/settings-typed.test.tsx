import { cleanup, fireEvent, render, screen, waitFor } from "@testing-library/react";
import { AppRouterContext } from "next/dist/shared/lib/app-router-context.shared-runtime";
import type { ContextType, ReactElement } from "react";
import { afterEach, describe, expect, test, vi } from "vitest";
import { limitFields } from "@/components/lightship/limit-fields";
import { SettingsForm } from "@/components/lightship/settings-form";
import { typedSettings, typedSettingsSchema } from "@/components/lightship/settings-typed";
import { usualLimits } from "@/lib/inclining/checks/check-limits";
import { usualAgreement } from "@/lib/sync/agreement";

afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

/** A page that can be shown anew, as the server's answer asks for. */
function shown(form: ReactElement) {
  const router = { refresh: () => undefined } as ContextType<typeof AppRouterContext>;
  render(<AppRouterContext.Provider value={router}>{form}</AppRouterContext.Provider>);
}

const usual = typedSettings(undefined);
const typed = (limits: Record<string, string>) => typedSettingsSchema.safeParse({ ...usual, limits: { ...usual.limits, ...limits } });

describe("the settings as typed", () => {
  test("show the usual where nothing is set, and set nothing where the usual is left standing", () => {
    expect(usual).toMatchObject({ method: "classical", weights: "equal" });
    expect(usual.limits).toMatchObject({ straightness: "5", heelLeast: "1", heelMost: "4", draftChange: "20", density: "0.5" });
    expect(typed({}).data).toEqual({});
  });

  test("have a field for every limit", () => {
    const keys = (of: "limits" | "agreement") => [...new Set(limitFields.flatMap(({ at }) => (at[0] === of ? [at[1]] : [])))].sort();
    expect(keys("limits")).toEqual(Object.keys(usualLimits).sort());
    expect(keys("agreement")).toEqual(Object.keys(usualAgreement).sort());
  });

  test("give back what was set, each limit alone, and show it again", () => {
    const set = { method: "generalised" as const, limits: { straightness: 0.01, heel: [1, 3.5] as [number, number] } };
    expect(typedSettingsSchema.parse(typedSettings(set))).toEqual(set);
    expect(typed({ draft: "25" }).data).toEqual({ agreement: { ...usualAgreement, draft: 0.025 } });
    expect(typed({ missing: "4,1" }).data).toEqual({ limits: { missing: 0.041 } });
  });

  test.each([
    [{ heelLeast: "5" }, "heelMost", "The lower limit must lie below the upper one."],
    [{ straightness: "0" }, "straightness", "More than 0 is needed."],
    [{ straightness: "100" }, "straightness", "That is too much for a limit."],
    [{ freeboards: "4.5" }, "freeboards", "A whole number is needed."],
    [{ deflection: "far" }, "deflection", "“far” is not a number."],
  ])("refuse %o with a sentence at its field", (limits, field, message) => {
    expect(typed(limits).error?.issues[0]).toMatchObject({ path: ["limits", field], message });
  });
});

describe("the form of the settings", () => {
  test("says that IMO gives no number for straightness and that its limit is a setting, and shows the usual one", () => {
    shown(<SettingsForm test="one" settings={undefined} />);
    const field = screen.getByLabelText("Straightness");
    const hint = document.getElementById(field.getAttribute("aria-describedby") ?? "")?.textContent;
    expect(hint).toMatch(/^IMO gives no number for straightness: this is a setting\..*Usual: 5 %\.$/);
    expect(screen.queryByRole("button", { name: "Back to the usual" })).toBeNull();
  });

  test("sends what differs from the usual, and null to go back to it", async () => {
    const sent: unknown[] = [];
    vi.stubGlobal("fetch", async (address: string, { body }: { body: string }) => {
      sent.push([address, JSON.parse(body)]);
      return new Response("{}");
    });
    shown(<SettingsForm test="one" settings={{ weights: "readings" }} />);
    fireEvent.change(screen.getByLabelText("Straightness"), { target: { value: "1" } });
    fireEvent.click(screen.getByRole("button", { name: "Set them for this test" }));
    await waitFor(() => expect(sent).toEqual([["/api/v1/tests/one/settings", { weights: "readings", limits: { straightness: 0.01 } }]]));
    fireEvent.click(screen.getByRole("button", { name: "Back to the usual" }));
    await waitFor(() => expect(sent[1]).toEqual(["/api/v1/tests/one/settings", null]));
  });
});
