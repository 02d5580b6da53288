import { desc, max } from "drizzle-orm";
import { backups } from "../schema/backups";
import { ledgerEntries } from "../schema/ledger";
import type { Database } from "./connection";

/** A copy that was found whole and stands in the backup folder under its name. */
export type Backup = Omit<typeof backups.$inferSelect, "id">;

/** The last backup that was made of this database; undefined: none was. */
export function lastBackup(db: Database): Backup | undefined {
  const row = db.select().from(backups).orderBy(desc(backups.id)).limit(1).get();
  if (!row) return undefined;
  const { id, ...backup } = row;
  return backup;
}

export function noteBackup(db: Database, backup: Backup): void {
  db.insert(backups).values(backup).run();
}

/** Every event up to this number is in a backup; 0 where none was made. */
export function confirmedTo(db: Database): number {
  return highest(
    db
      .select({ value: max(backups.serverSeq) })
      .from(backups)
      .get(),
  );
}

/** Whether anything was done that no backup holds. Every act has its entry in the ledger. */
export function isBackupDue(db: Database): boolean {
  const copied = highest(
    db
      .select({ value: max(backups.ledgerEntry) })
      .from(backups)
      .get(),
  );
  return (
    highest(
      db
        .select({ value: max(ledgerEntries.id) })
        .from(ledgerEntries)
        .get(),
    ) > copied
  );
}

function highest(found: { value: number | null } | undefined): number {
  return found?.value ?? 0;
}
