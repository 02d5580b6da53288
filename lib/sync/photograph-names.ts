import { z } from "zod";
import { PHOTOGRAPHS_A_READING } from "./photograph";

/** A photograph's name: SHA-256 of its bytes, hexadecimal. */
export const photographNameSchema = z.string().regex(/^[0-9a-f]{64}$/);

/** The photographs a reading was taken with. They travel apart; the event, and so its signature, names their bytes. */
export const photographNamesSchema = z.array(photographNameSchema).min(1).max(PHOTOGRAPHS_A_READING);
