import "client-only";
import { v4 as newUuid } from "uuid";
import { deviceDatabase } from "./device-database";
import { underDeviceLock } from "./device-lock";

export type Person = { readonly id: string; readonly name: string };

/** Who this phone is. The private key cannot leave the browser; where none can be kept the phone is unsigned, and says so. */
export type DeviceIdentity = {
  readonly key: "self";
  readonly device: string;
  readonly deviceName: string;
  readonly keys: CryptoKeyPair | null;
  /** the person who reads with this phone: the author of its events, whoever signs in to send them */
  readonly person: Person | null;
  readonly server: { readonly id: string; readonly epoch: string } | null;
  /** the phone's clock against the server's, as last measured [ms]; add it to the phone's time to get the server's */
  readonly clockOffsetMs: number | null;
  /** what the browser answered when asked never to clear this store */
  readonly persisted: boolean | null;
  readonly madeAt: string;
};

export function deviceIdentity(): Promise<DeviceIdentity | undefined> {
  return deviceDatabase().identity.get("self");
}

/** The identity of this phone, made at its first enrolment; a new name is taken over, key and number stay. */
export function enrolledIdentity(deviceName: string): Promise<DeviceIdentity> {
  return underDeviceLock("identity", async () => {
    const known = await deviceIdentity();
    const identity = known ? { ...known, deviceName } : await newIdentity(deviceName);
    await keepIdentity(identity);
    // a browser that drops keys on the way into the store is found out now and not below deck
    const kept = await deviceIdentity();
    return kept ?? identity;
  });
}

export async function updateIdentity(change: Partial<Omit<DeviceIdentity, "key" | "device" | "keys">>): Promise<void> {
  await deviceDatabase().identity.update("self", change);
}

/** A copied profile shares its number with another phone: take a new number and a new key, keep every event already made. */
export function renewedIdentity(): Promise<DeviceIdentity | null> {
  return underDeviceLock("identity", async () => {
    const known = await deviceIdentity();
    if (!known) return null;
    const fresh = await newIdentity(known.deviceName);
    await keepIdentity({ ...fresh, person: known.person, server: known.server, clockOffsetMs: known.clockOffsetMs });
    return fresh;
  });
}

/** The public half as the server registers it; null for an unsigned phone. */
export async function publicKeyOf(identity: DeviceIdentity): Promise<JsonWebKey | null> {
  if (!identity.keys) return null;
  const { kty, crv, x, y } = await crypto.subtle.exportKey("jwk", identity.keys.publicKey);
  return { kty, crv, x, y };
}

async function newIdentity(deviceName: string): Promise<DeviceIdentity> {
  return {
    key: "self",
    device: newUuid(),
    deviceName,
    keys: await newKeys(),
    person: null,
    server: null,
    clockOffsetMs: null,
    persisted: null,
    madeAt: new Date().toISOString(),
  };
}

async function newKeys(): Promise<CryptoKeyPair | null> {
  try {
    return await crypto.subtle.generateKey({ name: "ECDSA", namedCurve: "P-256" }, false, ["sign", "verify"]);
  } catch {
    return null;
  }
}

async function keepIdentity(identity: DeviceIdentity): Promise<void> {
  try {
    await deviceDatabase().identity.put(identity);
  } catch (error) {
    if (!identity.keys) throw error;
    await deviceDatabase().identity.put({ ...identity, keys: null });
  }
}
