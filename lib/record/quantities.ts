import { z } from "zod";

/** The kinds of number a record may hold; every one is finite. Metres, tonnes, t/m³ unless the key says `Mm` or `Degrees`. */
export const number = z.number();
export const positive = z.number().positive();
export const nonNegative = z.number().nonnegative();
export const wholeNumber = z.number().int().nonnegative();
export const ordinal = z.number().int().positive();

// half a surrogate pair has no bytes in UTF-8, so nobody could hash or sign it. Source: RFC 3629 §3
const wholeCharacters = z.string().refine((given) => given.isWellFormed(), "Half a character stands in it");

/** A name used as a reference: a station, mark, weight or tank. */
export const name = wholeCharacters.trim().min(1).max(60);
export const text = wholeCharacters.trim().min(1).max(2000);
export const time = z.iso.datetime();

/** [x, y, z] of a centre in the ship's frame. */
export const place = z.tuple([number, number, number]);
