import { cleanup, fireEvent, render, screen } from "@testing-library/react";
import { afterEach, describe, expect, test } from "vitest";
import { BackupPanel } from "@/components/backups/backup-panel";
import { BackupWarning } from "@/components/backups/backup-warning";
import type { BackupNews } from "@/lib/report/backup-words";

afterEach(cleanup);

const last = { at: new Date(Date.now() - 5 * 60_000).toISOString(), file: "battenbook-2026-05-04T10-00-00-000Z.db", bytes: 561_152 };
const well: BackupNews = { last, isDue: false, everyMinutes: 10, canBackUp: true, warnings: [] };
const late = "The last backup is 31 min old, and what came in since is in none.";
const shown = () => document.body.textContent ?? "";

describe("the panel of the backups", () => {
  test("shows the last one with its age and its size, and that it is whole", () => {
    render(<BackupPanel first={well} />);
    expect(shown()).toContain("Age5 min");
    expect(shown()).toContain("Size0.6 MB");
    expect(shown()).toContain("Looked throughwhole");
    expect(shown()).toContain("Done sincenothing");
  });

  test("says what is wrong in words", () => {
    render(<BackupPanel first={{ ...well, isDue: true, warnings: [late] }} />);
    expect(shown()).toContain(late);
    expect(shown()).toContain("not all is in it");
  });

  test("offers no button where no folder is set: it could only fail", () => {
    render(<BackupPanel first={{ ...well, last: null, canBackUp: false, warnings: ["No backup folder is set."] }} />);
    expect(screen.queryByRole("button")).toBeNull();
  });

  test("says when the server does not answer", async () => {
    // nothing listens on the port of the page's address
    (window as unknown as { happyDOM: { setURL: (url: string) => void } }).happyDOM.setURL("http://127.0.0.1:1/tests");
    render(<BackupPanel first={well} />);
    fireEvent.click(screen.getByRole("button", { name: "Back up now" }));
    expect((await screen.findByRole("alert")).textContent).toBe("The server does not answer; no backup was made.");
  });

  test("is nothing to those whom it does not concern", () => {
    render(<BackupPanel first={null} />);
    expect(shown()).toBe("");
  });
});

test("the warning takes room only while something is wrong", () => {
  const { rerender } = render(<BackupWarning key="well" first={well} />);
  expect(shown()).toBe("");
  rerender(<BackupWarning key="late" first={{ ...well, warnings: [late] }} />);
  expect(shown()).toContain(late);
});
