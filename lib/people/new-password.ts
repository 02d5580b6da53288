import { z } from "zod";

const LEAST = 12;
const MOST = 128;
/** Different characters below which a password is a pattern; a choice of ours. */
const LEAST_DIFFERENT = 5;

/**
 * A password that may be set: 12 to 128 characters of any kind, not one short pattern over and over, not a row of neighbours.
 * No rule asks for capitals, digits or signs.
 *
 * Source: OWASP ASVS 4.0.3, 2.1.1, 2.1.2, 2.1.4 and 2.1.9 (from memory); the two patterns are our own.
 */
export const newPasswordSchema = z
  .string()
  .min(LEAST, `At least ${LEAST} characters: a few words are easier to keep than a few signs.`)
  .max(MOST, `At most ${MOST} characters.`)
  .refine((password) => new Set(password).size >= LEAST_DIFFERENT, "Too few different characters.")
  .refine((password) => !isRowOfNeighbours(password), "A row of neighbours, as abcdef or 123456, is guessed first.");

function isRowOfNeighbours(password: string): boolean {
  const codes = [...password].map((character) => character.codePointAt(0) ?? 0);
  const steps = codes.slice(1).map((code, i) => code - (codes[i] ?? 0));
  const neighbours = steps.filter((step) => Math.abs(step) === 1).length;
  return neighbours >= 0.7 * steps.length;
}
