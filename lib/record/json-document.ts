import { answer, type Result, refuse } from "@/lib/result";
import type { NotJson } from "./record-faults";

/** Numbers that JSON does not know, as some programs write them. */
export const notNumbers: readonly string[] = ["NaN", "Infinity", "-Infinity"];

/**
 * The document in a text. A NaN or Infinity that stands where a number should is kept as that word, so that its place
 * can be named later; any other text that is not JSON is refused.
 */
export function jsonDocument(text: string): Result<unknown, NotJson> {
  const strict = parsed(text);
  if (strict.ok) return strict;
  const quoted = parsed(
    text.replace(/"(?:[^"\\]|\\.)*"|-?\bInfinity\b|\bNaN\b/g, (token) => (token.startsWith('"') ? token : `"${token}"`)),
  );
  return quoted.ok ? quoted : strict;
}

function parsed(text: string): Result<unknown, NotJson> {
  try {
    return answer(JSON.parse(text));
  } catch (error) {
    return refuse({ type: "NotJson", path: "record", reason: error instanceof Error ? error.message : "no reason given" });
  }
}
