import { backupFaultSentence } from "@/lib/report/backup-words";
import { type HeadLost, restoreFaultSentence } from "@/lib/report/restore-words";
import { type Database, database } from "../connection";
import { restore } from "../restore";
import { testById } from "../tests";

/** Puts a backup in the place of the database: `npm run restore -- FILE`, with `--force` where the copy does not stand examination. */
const copy = process.argv.slice(2).find((word) => !word.startsWith("--"));
const force = process.argv.includes("--force");
if (copy === undefined) fail("Which copy? npm run restore -- FILE");
else await restoreFrom(copy);

async function restoreFrom(file: string): Promise<void> {
  const restored = await restore(file, { at: new Date().toISOString(), force });
  if (!restored.ok) return fail(`Nothing was changed. ${restoreFaultSentence(restored.refusal)}`);
  const { epoch, kept, headsLost, passedOver, fileFault } = restored.value;
  const db = database();
  console.log(`Restored from ${file}. New epoch ${epoch}: phones send again what this copy lacks.`);
  if (kept !== null) console.log(`The database that was here before is kept as ${kept}.`);
  for (const fault of passedOver) console.log(`Passed over: ${restoreFaultSentence(fault)}`);
  if (headsLost === null) console.log("The database that was here before can't be read: what it held beyond the copy is not known.");
  for (const head of headsLost ?? []) console.log(`No longer shown: ${headInWords(db, head)}`);
  if (fileFault) console.log(backupFaultSentence(fileFault));
  console.log("Roles, passwords and revoked phones are as they were in the copy: look through them.");
  db.$client.close();
}

function headInWords(db: Database, { chain, seq, head }: HeadLost): string {
  const named = chain === null ? "the server's ledger" : (testById(db, chain)?.title ?? `test ${chain}`);
  return `${named}, what followed on the copy up to entry ${seq}, head ${head}`;
}

function fail(sentence: string): void {
  console.error(sentence);
  process.exitCode = 1;
}
