import type { Refusal } from "@/lib/result";
import { floatingClauses } from "./floating-clauses";
import { inclinedClauses } from "./inclined-clauses";
import type { Clauses, KnownRefusal } from "./known-refusal";
import { numericsClauses } from "./numerics-clauses";
import { recordClauses } from "./record-clauses";
import { sheetClauses, uploadClauses } from "./sheet-clauses";

const clauses: Clauses<KnownRefusal> = {
  ...numericsClauses,
  ...floatingClauses,
  ...inclinedClauses,
  ...recordClauses,
  ...uploadClauses,
  ...sheetClauses,
};

/** What was refused and why, as one plain sentence. */
export function refusalSentence(refusal: Refusal): string {
  const clause = refusalClause(refusal);
  return `${clause.charAt(0).toUpperCase()}${clause.slice(1)}.`;
}

/** A refusal as one line with its place in the record: `readings.battens[3].valuesMm: at least 3 turning points, 2 given`. */
export function refusalLine(refusal: Refusal): string {
  return `${refusal.path ?? "record"}: ${refusalClause(refusal)}`;
}

function refusalClause(refusal: Refusal): string {
  return isKnown(refusal) ? clauseOf(refusal) : `the data do not allow it (${refusal.type})`;
}

function isKnown(refusal: Refusal): refusal is KnownRefusal {
  return Object.hasOwn(clauses, refusal.type);
}

// the table pairs each type with its own clause; the pairing itself is beyond the checker
function clauseOf(refusal: KnownRefusal): string {
  const clause = clauses[refusal.type] as (refusal: KnownRefusal) => string;
  return clause(refusal);
}
