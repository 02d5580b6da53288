import { z } from "zod";

/** The kinds of number a record may hold; every one is finite. Metres, tonnes, t/m³ unless the key says `Mm` or `Degrees`. */
export const number = z.number();
export const positive = z.number().positive();
export const nonNegative = z.number().nonnegative();
export const wholeNumber = z.number().int().nonnegative();
export const ordinal = z.number().int().positive();

/** A name used as a reference: a station, mark, weight or tank. */
export const name = z.string().trim().min(1).max(60);
export const text = z.string().trim().min(1).max(2000);
export const time = z.iso.datetime();

/** [x, y, z] of a centre in the ship's frame. */
export const place = z.tuple([number, number, number]);
