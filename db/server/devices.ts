import { and, desc, eq, inArray } from "drizzle-orm";
import { z } from "zod";
import { answer, type Result, refuse } from "@/lib/result";
import { deviceHolders, devices, enrolmentCodes } from "../schema/devices";
import { events } from "../schema/events";
import type { Act } from "./act";
import { tellChange } from "./changes";
import { type Database, inTransaction } from "./connection";
import { writeEntry } from "./ledger-entries";

export type Device = typeof devices.$inferSelect;

const coordinate = z.string().regex(/^[A-Za-z0-9_-]{43}$/);

/** The public half of a phone's signing key; whatever else the browser puts in is left out. */
export const publicKeySchema = z.object({ kty: z.literal("EC"), crv: z.literal("P-256"), x: coordinate, y: coordinate });

export const newDeviceSchema = z.strictObject({
  device: z.uuid(),
  name: z.string().trim().min(1).max(80),
  publicKey: publicKeySchema.nullable(),
});
export type NewDevice = z.infer<typeof newDeviceSchema>;

export type DeviceRefusal = { type: "DeviceRevoked"; device: string } | { type: "DeviceHasAnotherKey"; device: string };

export function deviceById(db: Database, id: string): Device | undefined {
  return db.select().from(devices).where(eq(devices.id, id)).get();
}

/** Phones that were enrolled for a test, the last one first. */
export function devicesEnrolledIn(db: Database, test: string): Device[] {
  const used = db.select({ id: enrolmentCodes.usedBy }).from(enrolmentCodes).where(eq(enrolmentCodes.test, test));
  return db.select().from(devices).where(inArray(devices.id, used)).orderBy(desc(devices.enrolledAt)).all();
}

/** Whether a device was let into a test by a code, or has sent something of it. */
function isDeviceOf(db: Database, device: string, test: string): boolean {
  if (devicesEnrolledIn(db, test).some(({ id }) => id === device)) return true;
  const sent = and(eq(events.device, device), eq(events.test, test));
  return db.select({ id: events.id }).from(events).where(sent).limit(1).get() !== undefined;
}

/**
 * Makes a device known, for the person who holds it now. A device keeps its key for ever:
 * with another key its earlier events could no longer be verified.
 */
export function registerDevice(db: Database, given: NewDevice, account: string, act: Act): Result<Device, DeviceRefusal> {
  return inTransaction(db, () => {
    const refusal = deviceRefusal(db, given);
    if (refusal) return refuse(refusal);
    const known = deviceById(db, given.device);
    const row = { id: given.device, name: given.name, account, publicKey: given.publicKey, enrolledAt: act.at };
    const device = db
      .insert(devices)
      .values(row)
      .onConflictDoUpdate({ target: devices.id, set: { name: row.name, account } })
      .returning()
      .get();
    noteHolder(db, device.id, account);
    if (known?.account !== account) writeEntry(db, null, { ...act, what: "device.register", after: shown(device) });
    return answer(device);
  });
}

/** One more person in whose name a device may speak. */
export function noteHolder(db: Database, device: string, account: string): void {
  db.insert(deviceHolders).values({ device, account }).onConflictDoNothing().run();
}

/** Whether a person has ever held a device. */
export function isHolder(db: Database, device: string, account: string): boolean {
  const held = and(eq(deviceHolders.device, device), eq(deviceHolders.account, account));
  return db.select().from(deviceHolders).where(held).get() !== undefined;
}

/** Hears of a device: when, and how many events it still holds unsent. */
export function noteHeard(db: Database, id: string, holds: number, at: string): void {
  db.update(devices).set({ lastHeardAt: at, holds }).where(eq(devices.id, id)).run();
}

/** Why this device may not be registered; null where it may. */
export function deviceRefusal(db: Database, given: NewDevice): DeviceRefusal | null {
  const known = deviceById(db, given.device);
  if (!known) return null;
  if (known.revokedAt !== null) return { type: "DeviceRevoked", device: known.id };
  return isSameKey(known.publicKey, given.publicKey) ? null : { type: "DeviceHasAnotherKey", device: known.id };
}

/** Stops a device at once; what it sent before stands, what it still sends is kept in quarantine. */
export function revokeDevice(db: Database, id: string, act: Act): void {
  inTransaction(db, () => {
    db.update(devices).set({ revokedAt: act.at }).where(eq(devices.id, id)).run();
    writeEntry(db, null, { ...act, what: "device.revoke", after: { device: id } });
  });
}

/** Stops a phone of a test, and says so on the test's open pages; false where it is none of this test. */
export function stopPhoneOf(db: Database, device: string, test: string, act: Act): boolean {
  if (!isDeviceOf(db, device, test)) return false;
  revokeDevice(db, device, act);
  tellChange(test);
  return true;
}

function isSameKey(kept: Record<string, unknown> | null, given: NewDevice["publicKey"]): boolean {
  return kept?.x === given?.x && kept?.y === given?.y;
}

function shown({ id, name, account, publicKey }: Device) {
  return { device: id, name, account, signs: publicKey !== null };
}
