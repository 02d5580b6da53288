import { cleanup, fireEvent, render, screen, waitFor, within } from "@testing-library/react";
import { afterEach, describe, expect, test } from "vitest";
import { Decisions } from "@/components/control/decisions";
import type { LeadActs } from "@/components/control/lead-acts";
import type { LiveSnapshot } from "@/lib/sync/live";
import { bargeSnapshot, battenSlot } from "./barge-snapshot";

afterEach(cleanup);

type Settled = Parameters<LeadActs["resolve"]>;

/** Acts that only note what was settled. */
function noting(settled: Settled[]): LeadActs {
  const nothing = async () => undefined;
  const resolve: LeadActs["resolve"] = async (...given) => void settled.push(given);
  const orders = { openMove: nothing, closeMove: nothing, repeatMove: nothing, excludeMove: nothing };
  return { ...orders, record: nothing, correct: nothing, release: nothing, takeBack: nothing, assign: nothing, writeOff: nothing, resolve };
}

const other = "0190a5d1-5d00-4000-8000-0000000000a2";
const disputed = bargeSnapshot({
  read: 2,
  open: null,
  called: [{ slot: battenSlot(1, "A"), value: { mode: "settled", valuesMm: [80] }, from: other }],
});

function slotDue(snapshot: LiveSnapshot) {
  const due = snapshot.due.find(({ state }) => state === "disagrees");
  if (!due) throw new Error("nothing disagrees");
  return due;
}

describe("what needs the lead's decision", () => {
  test("is one quiet line where nothing does", () => {
    render(<Decisions snapshot={bargeSnapshot({ read: 2, open: null })} acts={null} />);
    expect(screen.getByText("Nothing waits for a decision.")).toBeDefined();
  });

  test("puts disagreeing readings side by side with who read them", () => {
    render(<Decisions snapshot={disputed} acts={null} />);
    const table = screen.getByRole("table", { name: /station A at move 1/ });
    const rows = within(table).getAllByRole("row").slice(1);
    expect(rows.map((row) => row.textContent)).toEqual([expect.stringContaining("61.3 mm"), expect.stringContaining("80.0 mm")]);
    expect(rows[1]?.textContent).toContain(other);
  });

  test("gives a witness no form", () => {
    render(<Decisions snapshot={disputed} acts={null} />);
    expect(screen.queryByRole("button", { name: "Settle" })).toBeNull();
  });

  test("asks for a choice and a reason before anything is settled", async () => {
    const settled: Settled[] = [];
    render(<Decisions snapshot={disputed} acts={noting(settled)} />);
    fireEvent.click(screen.getByRole("button", { name: "Settle" }));
    const sentences = (await screen.findAllByRole("alert")).map((alert) => alert.textContent);
    expect(sentences).toContain("Choose what is to stand.");
    expect(sentences).toContain("Write the reason: it stands in the ledger beside your name.");
    expect(settled).toEqual([]);
  });

  test("settles with one reading, naming every head", async () => {
    const settled: Settled[] = [];
    const due = slotDue(disputed);
    render(<Decisions snapshot={disputed} acts={noting(settled)} />);
    fireEvent.click(screen.getByLabelText(/^A:/));
    fireEvent.change(screen.getByLabelText("Reason"), { target: { value: "B read the wrong edge" } });
    fireEvent.click(screen.getByRole("button", { name: "Settle" }));
    const choice = { choice: "one", head: due.heads[0] };
    await waitFor(() => expect(settled).toEqual([[due.heads, due.slot, choice, "B read the wrong edge"]]));
    expect(due.heads).toHaveLength(2);
  });

  test("settles with a new value typed in the reading's own unit", async () => {
    const settled: Settled[] = [];
    render(<Decisions snapshot={disputed} acts={noting(settled)} />);
    fireEvent.click(screen.getByLabelText("A new value"));
    fireEvent.change(await screen.findByLabelText(/^Value/), { target: { value: "61,5" } });
    fireEvent.change(screen.getByLabelText("Reason"), { target: { value: "read again together" } });
    fireEvent.click(screen.getByRole("button", { name: "Settle" }));
    await waitFor(() => expect(settled[0]?.[2]).toEqual({ choice: "new", value: { mode: "settled", valuesMm: [61.5] } }));
  });

  test("names a phone's missing readings by their numbers", () => {
    const phone = {
      device: "0190a5d1-5d00-4000-8000-0000000000d2",
      name: "Deck phone",
      person: "Ida",
      roles: ["reader" as const],
      revoked: false,
      lastHeardAt: null,
      holds: 2,
      highestSeq: 41,
      received: 39,
      missing: [12, 13],
      writtenOff: null,
    };
    render(<Decisions snapshot={{ ...bargeSnapshot({ read: 0, open: null }), phones: [phone] }} acts={null} />);
    expect(screen.getByText("Deck phone (Ida): 41 taken, 39 received, missing 12–13.")).toBeDefined();
  });
});
