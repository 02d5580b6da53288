import { z } from "zod";
import { BATCH_BYTES, BATCH_EVENTS } from "./batch-limits";
import { photographNameSchema } from "./photograph-names";
import { type Envelope, envelopeSchema } from "./protocol";

/** What a phone exports where no network ever comes: all its events, in the bytes that were signed. */
export const phoneFileSchema = z.object({
  format: z.literal("battenbook-phone"),
  version: z.literal(1),
  device: z.uuid(),
  deviceName: z.string().nullable(),
  events: z.array(envelopeSchema),
  /** photographs that no server has answered for, as far as a file can carry them; a phone of an older build has none */
  photographs: z.array(z.object({ sha256: photographNameSchema, type: z.string(), base64: z.base64() })).optional(),
  /** how many had no room in the file and stay on the phone */
  photographsLeft: z.number().int().nonnegative().optional(),
  /** what the phone's store refused: never numbered, to be typed in by hand */
  unsaved: z.unknown(),
});
export type PhoneFile = z.infer<typeof phoneFileSchema>;

/** The events of a file in batches that one request may carry, in their order. */
export function batchesOf(events: readonly Envelope[]): readonly (readonly Envelope[])[] {
  const batches: Envelope[][] = [];
  let bytes = Number.POSITIVE_INFINITY;
  for (const event of events) {
    const size = JSON.stringify(event).length;
    const last = batches.at(-1);
    if (last === undefined || last.length === BATCH_EVENTS || bytes + size > BATCH_BYTES) {
      batches.push([event]);
      bytes = size;
    } else {
      last.push(event);
      bytes += size;
    }
  }
  return batches;
}
