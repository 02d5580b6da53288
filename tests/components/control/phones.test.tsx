import { cleanup, fireEvent, render, screen } from "@testing-library/react";
import { afterEach, expect, test } from "vitest";
import { Phones } from "@/components/control/phones";
import type { Phone } from "@/lib/sync/live";

afterEach(cleanup);

const phone: Phone = {
  device: "0190a5d1-5d00-4000-8000-0000000000d1",
  name: "Blue phone, aft",
  person: "Mara",
  roles: ["reader"],
  revoked: false,
  lastHeardAt: null,
  holds: 0,
  highestSeq: 3,
  received: 3,
  missing: [],
  writtenOff: null,
};

test("a phone is stopped by whoever leads, after being asked once more, and a refusal is said", async () => {
  const stopped: string[] = [];
  const onStop = async (device: string) => {
    stopped.push(device);
    return "The server does not answer; the phone was not stopped.";
  };
  render(<Phones phones={[phone]} onStop={onStop} />);
  fireEvent.click(screen.getByRole("button", { name: "Stop" }));
  expect(stopped).toEqual([]);
  fireEvent.click(screen.getByRole("button", { name: "Stop this phone" }));
  expect(stopped).toEqual([phone.device]);
  expect((await screen.findByRole("alert")).textContent).toContain("was not stopped");
});

test("a stopped phone says so, and who only watches stops none", () => {
  render(<Phones phones={[{ ...phone, revoked: true }]} onStop={async () => null} />);
  expect(screen.getByText("stopped")).toBeDefined();
  expect(screen.queryByRole("button", { name: "Stop" })).toBeNull();
  cleanup();
  render(<Phones phones={[phone]} onStop={null} />);
  expect(screen.queryByRole("button", { name: "Stop" })).toBeNull();
});
