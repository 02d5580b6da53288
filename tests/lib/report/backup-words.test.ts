import { describe, expect, it } from "vitest";
import { ageInWords, type BackupFault, type BackupStanding, backupFaultSentence, backupWarnings } from "@/lib/report/backup-words";

const at = "2026-05-04T10:00:00.000Z";
const minutesLater = (minutes: number) => Date.parse(at) + minutes * 60_000;
const well: BackupStanding = {
  folder: "/mnt/stick",
  everyMinutes: 10,
  last: { at, file: "battenbook-2026-05-04T10-00-00-000Z.db", bytes: 561_152 },
  isDue: false,
  isOnDataDisk: false,
  fault: null,
};

describe("the warnings about backups", () => {
  it("are none while the last one holds everything, however old it is", () => {
    expect(backupWarnings(well, minutesLater(5))).toEqual([]);
    expect(backupWarnings(well, minutesLater(100_000))).toEqual([]);
  });

  it("call it late after three that should have been made, not before", () => {
    const due = { ...well, isDue: true };
    expect(backupWarnings(due, minutesLater(30))).toEqual([]);
    expect(backupWarnings(due, minutesLater(31))).toEqual(["The last backup is 31 min old, and what came in since is in none."]);
    expect(backupWarnings({ ...due, everyMinutes: 20 }, minutesLater(31))).toEqual([]);
  });

  it("say that nothing is in a backup yet, where there is something", () => {
    expect(backupWarnings({ ...well, last: null, isDue: true }, minutesLater(0))).toEqual(["Nothing on this server is in a backup yet."]);
    expect(backupWarnings({ ...well, last: null }, minutesLater(0))).toEqual([]);
  });

  it("say what is wrong, and that one disk is no second place", () => {
    const bad: BackupStanding = { ...well, isOnDataDisk: true, fault: { type: "BackupDiskFull", folder: "/mnt/stick" } };
    expect(backupWarnings(bad, minutesLater(0))).toEqual([
      "The disk of the backup folder /mnt/stick is full.",
      "The backup folder is on the same disk as the database: if that disk fails, both are gone.",
    ]);
  });
});

it.each<BackupFault>([
  { type: "NoBackupFolder" },
  { type: "BackupFolderMissing", folder: "/mnt/stick" },
  { type: "BackupFolderIsDataFolder", folder: "/mnt/stick" },
  { type: "BackupFolderClosed", folder: "/mnt/stick" },
  { type: "BackupDiskFull", folder: "/mnt/stick" },
  { type: "BackupDamaged", found: "row 3 missing from index events_id" },
  { type: "FileDamaged", file: "ab12" },
  { type: "BackupFailed", message: "disk I/O error" },
])("$type is one plain sentence that names what it is about", (fault) => {
  const { type, ...named } = fault;
  const sentence = backupFaultSentence(fault);
  expect(sentence).toMatch(/^[A-Z][^.?]*[.?]$/);
  for (const word of Object.values(named)) expect(sentence).toContain(String(word));
});

it.each([
  [29_000, "0 min"],
  [31 * 60_000, "31 min"],
  [119 * 60_000, "119 min"],
  [120 * 60_000, "2 h"],
  [47 * 3_600_000, "47 h"],
  [60 * 3_600_000, "3 days"],
])("%i ms are %s", (ms, words) => {
  expect(ageInWords(ms)).toBe(words);
});
