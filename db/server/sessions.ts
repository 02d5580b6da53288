import { z } from "zod";
import { accountById } from "./accounts";
import type { Database } from "./connection";
import { deviceById } from "./devices";

/** Who asks, as this server knows the person now. */
export type Person = {
  readonly id: string;
  readonly name: string;
  readonly locale: string;
  /** the enrolled phone the session belongs to; null: signed in with a password */
  readonly device: string | null;
  readonly isAdministrator: boolean;
  /** may make vessels and tests */
  readonly isEngineer: boolean;
};

/** What a session's cookie says, sealed. */
export const sealSchema = z.object({ sub: z.uuid(), version: z.number().int(), device: z.uuid().nullable(), endsAt: z.iso.datetime() });
export type Seal = z.infer<typeof sealSchema>;

/**
 * The person of a session; null where it no longer stands. Asked at every request, so that a closed account,
 * a changed password and a revoked phone stop at once, not when a cookie runs out.
 */
export function standingPerson(db: Database, seal: unknown, at: string): Person | null {
  const read = sealSchema.safeParse(seal);
  if (!read.success || read.data.endsAt <= at) return null;
  const { sub, version, device } = read.data;
  const account = accountById(db, sub);
  if (!account || account.closedAt !== null || account.sessionVersion !== version) return null;
  if (device !== null && deviceById(db, device)?.revokedAt !== null) return null;
  const { id, name, locale, isAdministrator, isEngineer } = account;
  return { id, name, locale, device, isAdministrator, isEngineer };
}
