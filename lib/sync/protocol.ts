import { z } from "zod";
import { ordinal, time, wholeNumber } from "@/lib/record/quantities";
import { BATCH_EVENTS } from "./batch-limits";

/** `POST /api/v1/sync`: what a phone sends and what it hears. Bodies travel as the exact canonical text they were signed over. */
export const PROTOCOL = 1;

export const envelopeSchema = z.strictObject({
  body: z
    .string()
    .min(2)
    .max(64 * 1024),
  /** ECDSA P-256 with SHA-256 over the body's UTF-8 bytes, base64url; null where the phone could not keep a key */
  signature: z.string().max(200).nullable(),
});
export type Envelope = z.infer<typeof envelopeSchema>;

export const syncRequestSchema = z.strictObject({
  protocol: z.literal(PROTOCOL),
  device: z.uuid(),
  /** how many events the phone says it still holds unsent, this batch included */
  holds: wholeNumber,
  events: z.array(envelopeSchema).max(BATCH_EVENTS),
});
export type SyncRequest = z.infer<typeof syncRequestSchema>;

export const outcomeSchema = z.enum(["applied", "duplicate", "disagrees", "deferred", "quarantined"]);
export type Outcome = z.infer<typeof outcomeSchema>;

export const quarantineCodeSchema = z.enum([
  "malformed-body",
  "unknown-test",
  "unknown-slot",
  "unknown-device",
  "revoked-device",
  "bad-signature",
  "same-id-other-bytes",
  "forked-device",
  "role-not-held",
  "base-quarantined",
  "value-does-not-fit-slot",
  "not-set-aside",
  "server-fault",
]);
export type QuarantineCode = z.infer<typeof quarantineCodeSchema>;

export const receiptSchema = z.strictObject({
  /** null where no id could be read out of the body */
  id: z.uuid().nullable(),
  outcome: outcomeSchema,
  serverSeq: ordinal,
  code: quarantineCodeSchema.optional(),
  message: z.string().optional(),
});
export type Receipt = z.infer<typeof receiptSchema>;

/** Read with patience: a phone of an older build leaves out what a newer server says besides. */
export const syncAnswerSchema = z.object({
  server: z.object({ id: z.uuid(), epoch: z.uuid(), time }),
  /** one per event, in the order sent */
  results: z.array(receiptSchema),
  /** the hash of each envelope as it arrived, see `envelopeHash`: what broke on its way is sent again */
  received: z.array(z.string()),
  device: z.object({ highestSeq: wholeNumber, missing: z.array(ordinal) }),
  /** every event that the server took in up to this number is in a backup; 0 where none was made */
  confirmedTo: wholeNumber.default(0),
  /** head of the chain of the last test touched; null where none was */
  ledgerHead: z.string().nullable(),
});
export type SyncAnswer = z.infer<typeof syncAnswerSchema>;
