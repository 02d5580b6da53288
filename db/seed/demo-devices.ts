import { generateKeyPairSync, sign } from "node:crypto";
import type { Database } from "@/db/server/connection";
import { publicKeySchema, registerDevice } from "@/db/server/devices";
import { EventWriter } from "@/db/server/event-writer";
import { promised } from "@/lib/result";
import { demoPeople } from "./demo-people";

export type DemoDevice = "wheelhouse" | "maras" | "nilss";

const devices = {
  wheelhouse: { id: "5ce44715-0000-4000-8000-000000000201", name: "Wheelhouse laptop", holder: demoPeople.lead },
  maras: { id: "5ce44715-0000-4000-8000-000000000202", name: "Mara's phone", holder: demoPeople.mara },
  nilss: { id: "5ce44715-0000-4000-8000-000000000203", name: "Nils's phone", holder: demoPeople.nils },
} as const;

export function deviceId(device: DemoDevice): string {
  return devices[device].id;
}

export function holderOf(device: DemoDevice): string {
  return devices[device].holder.id;
}

/** Makes the three devices known and gives each its writer. Each key is made here, signs the demo's events and is then forgotten. */
export function demoWriters(db: Database, test: string, jobTag: string, at: string): Record<DemoDevice, EventWriter> {
  const writer = (name: DemoDevice) => {
    const { publicKey, privateKey } = generateKeyPairSync("ec", { namedCurve: "P-256" });
    const key = publicKeySchema.parse(publicKey.export({ format: "jwk" }));
    const { id: device, name: shown, holder } = devices[name];
    promised(registerDevice(db, { device, name: shown, publicKey: key }, holder.id, { by: holder.id, at, device }));
    return new EventWriter({ device, test, jobTag }, (body) =>
      sign("sha256", Buffer.from(body, "utf8"), { key: privateKey, dsaEncoding: "ieee-p1363" }).toString("base64url"),
    );
  };
  return { wheelhouse: writer("wheelhouse"), maras: writer("maras"), nilss: writer("nilss") };
}
