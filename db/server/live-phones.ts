import { eq } from "drizzle-orm";
import type { Phone } from "@/lib/sync/live";
import { events } from "../schema/events";
import { accountById } from "./accounts";
import type { Database } from "./connection";
import { type Device, deviceById, devicesEnrolledIn } from "./devices";
import { receivedFrom } from "./event-store";
import { rolesOf } from "./role-grants";
import { writeOffs } from "./write-offs";

/** The phones of a test, those enrolled for it and those that have sent for it: last heard, what they hold, gaps in their numbers. */
export function livePhones(db: Database, test: string, at: string): Phone[] {
  const enrolled = devicesEnrolledIn(db, test);
  const known = new Set(enrolled.map(({ id }) => id));
  const senders = db.selectDistinct({ device: events.device }).from(events).where(eq(events.test, test)).all();
  const others = senders.flatMap(({ device }) => {
    const sender = known.has(device) ? undefined : deviceById(db, device);
    return sender ? [sender] : [];
  });
  const off = writeOffs(db, test);
  return [...enrolled, ...others].map((device) => ({ ...phoneOf(db, test, device, at), writtenOff: off.get(device.id) ?? null }));
}

function phoneOf(db: Database, test: string, device: Device, at: string): Omit<Phone, "writtenOff"> {
  const { id, name, account, revokedAt, lastHeardAt, holds } = device;
  return {
    device: id,
    name,
    person: accountById(db, account)?.name ?? "",
    roles: rolesOf(db, account, test, at),
    revoked: revokedAt !== null,
    lastHeardAt,
    holds,
    ...receivedFrom(db, id),
  };
}
