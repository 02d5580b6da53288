import { type Faults, refuseFaults } from "@/lib/inclining/faults";
import { answer, type Result } from "@/lib/result";
import { jsonDocument } from "./json-document";
import { planFaults } from "./plan-faults";
import { readingFaults } from "./reading-faults";
import { schemaFaults } from "./schema-faults";
import { type TestRecord, testRecordSchema } from "./test-record";

/**
 * The test record in a text, or every fault of it with its place in the document.
 *
 * First the shapes (unknown keys, kinds of number, missing parts); where these are right, what refers to what: names given
 * twice, readings of unknown stations, marks, weights, tanks and moves, moves without the place of a weight, values of the
 * wrong instrument, too few turning points.
 */
export function parseRecord(text: string): Result<TestRecord, Faults> {
  const document = jsonDocument(text);
  return document.ok ? recordFrom(document.value) : refuseFaults([document.refusal]);
}

/** The test record that a document holds, or every fault of it. */
export function recordFrom(document: unknown): Result<TestRecord, Faults> {
  const shaped = testRecordSchema.safeParse(document);
  if (!shaped.success) return refuseFaults(schemaFaults(document, shaped.error.issues));
  const faults = [...planFaults(shaped.data), ...readingFaults(shaped.data)];
  return faults.length > 0 ? refuseFaults(faults) : answer(shaped.data);
}
