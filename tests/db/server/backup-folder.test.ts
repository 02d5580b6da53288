import { describe, expect, test } from "vitest";
import { backupSettings, copiesToRemove, copyNamed } from "@/db/server/backup-folder";

const hour = 3_600_000;
const newest = Date.parse("2026-05-31T20:00:00.000Z");
const hourly = (hours: number) => Array.from({ length: hours }, (_, i) => copyNamed(new Date(newest - i * hour).toISOString()));

describe("the copies that are kept", () => {
  test("are all of them while there are at most 24", () => {
    expect(copiesToRemove(hourly(24))).toEqual([]);
  });

  test("are the newest 24 and the last of each of 30 days", () => {
    const names = hourly(24 * 60);
    const gone = new Set(copiesToRemove(names));
    const kept = names.filter((name) => !gone.has(name));
    expect(kept.slice(0, 24)).toEqual(names.slice(0, 24));
    // two of the 30 days have their last copy among the 24
    expect(kept).toHaveLength(24 + 28);
    expect(kept.slice(24).every((name) => name.includes("T23-00"))).toBe(true);
    expect(kept.at(-1)).toContain("2026-05-02");
  });

  test("are nobody else's business: a file of another name is never removed", () => {
    const strangers = ["photographs.zip", "battenbook.db", "battenbook-before-restore.db", "my battenbook-2026-05-04T10-00-00-000Z.db"];
    expect(copiesToRemove([...strangers, ...hourly(200)]).filter((name) => strangers.includes(name))).toEqual([]);
  });
});

describe("how often", () => {
  test.each([
    ["", 10],
    ["2", 2],
    ["0.5", 0.5],
  ])("%j means every %d minutes", (minutes, every) => {
    process.env.BATTENBOOK_BACKUP_MINUTES = minutes;
    expect(backupSettings().everyMinutes).toBe(every);
  });

  test.each(["0", "-1", "soon", "1441"])("%j is refused in words", (minutes) => {
    process.env.BATTENBOOK_BACKUP_MINUTES = minutes;
    expect(backupSettings).toThrow(`BATTENBOOK_BACKUP_MINUTES must be above 0 and at most a day of 1440, not "${minutes}"`);
  });
});
