import type { Refusal } from "@/lib/result";
import { type LedgerFault, ledgerFaultClause } from "./ledger-words";

/** Why a copy is not put in the place of the database; the last two yield to force. */
export type RestoreFault = Refusal &
  (
    | { readonly type: "CopyMissing"; readonly file: string }
    | { readonly type: "CopyOfSomethingElse"; readonly file: string }
    | { readonly type: "ServerRuns" }
    | { readonly type: "RestoreFailed"; readonly message: string }
    | { readonly type: "CopyDamaged"; readonly found: string }
    | { readonly type: "CopyLedgerBroken"; readonly fault: LedgerFault }
  );

/** The last entry of a chain that the server held before and holds no more; a test, or null for the server's own chain. */
export type HeadLost = { readonly chain: string | null; readonly seq: number; readonly head: string };

/** Why a copy was not put in the place of the database, as one plain sentence. */
export function restoreFaultSentence(fault: RestoreFault): string {
  switch (fault.type) {
    case "CopyMissing":
      return `There is no file ${fault.file}.`;
    case "CopyOfSomethingElse":
      return `${fault.file} is no copy of this program's database.`;
    case "ServerRuns":
      return "The database is in use: stop the server first.";
    case "RestoreFailed":
      return `The copy could not be put in place: ${fault.message}.`;
    case "CopyDamaged":
      return `The copy is damaged: ${fault.found}.`;
    case "CopyLedgerBroken":
      return `The ledger in the copy does not fit: ${ledgerFaultClause(fault.fault)}.`;
  }
}
