import { cleanup, fireEvent, render, screen } from "@testing-library/react";
import { afterEach, describe, expect, test } from "vitest";
import { ImportRecord } from "@/components/tests/import-record";
import { bargeRecord } from "../control/barge";

afterEach(cleanup);

function choose(text: string) {
  render(<ImportRecord />);
  const file = new File([text], "record.json", { type: "application/json" });
  fireEvent.change(screen.getByLabelText("Record file"), { target: { files: [file] } });
}

describe("importing a record file", () => {
  test("refuses what is no JSON document", async () => {
    choose("move;station;mm");
    expect((await screen.findByRole("alert")).textContent).toContain("This is no JSON document.");
  });

  test("names the place of each fault", async () => {
    const record = bargeRecord(1);
    choose(JSON.stringify({ ...record, vessel: { ...record.vessel, lbp: -60 }, surprise: 1 }));
    const told = (await screen.findByRole("alert")).textContent ?? "";
    expect(told).toContain("vessel.lbp:");
    expect(told).toContain("surprise");
  });

  test("says when the server does not answer", async () => {
    // nothing listens on the port of the page's address
    (window as unknown as { happyDOM: { setURL: (url: string) => void } }).happyDOM.setURL("http://127.0.0.1:1/tests");
    choose(JSON.stringify(bargeRecord(1)));
    expect((await screen.findByRole("alert")).textContent).toContain("The server does not answer; nothing was taken in.");
  });
});
