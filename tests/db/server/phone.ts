import { generateKeyPairSync, type KeyObject, randomUUID, sign } from "node:crypto";
import { v7 } from "uuid";
import type { Database } from "@/db/server/connection";
import { publicKeySchema, registerDevice } from "@/db/server/devices";
import { EventWriter, noReading, type WrittenAct } from "@/db/server/event-writer";
import { takeEvents } from "@/db/server/take-events";
import { promised } from "@/lib/result";
import type { EventOf } from "@/lib/sync/event";
import type { Envelope, SyncAnswer } from "@/lib/sync/protocol";
import type { Slot } from "@/lib/sync/slot";
import { at } from "./yard";

type Own = "id" | "author" | "capturedAt" | "clockOffsetMs" | "reason";
type Said = WrittenAct extends infer A ? (A extends WrittenAct ? Omit<A, Own> & Partial<Pick<A, Own>> : never) : never;

/** A phone in the hands of one person: it numbers, signs and sends as the real one does. */
export class Phone {
  readonly device = randomUUID();
  private readonly key: KeyObject;
  private readonly writer: EventWriter;

  constructor(
    private readonly db: Database,
    readonly test: string,
    readonly person: string,
  ) {
    const { publicKey, privateKey } = generateKeyPairSync("ec", { namedCurve: "P-256" });
    this.key = privateKey;
    const known = { device: this.device, name: "Phone", publicKey: publicKeySchema.parse(publicKey.export({ format: "jwk" })) };
    promised(registerDevice(db, known, person, { by: person, at }));
    this.writer = new EventWriter({ device: this.device, test, jobTag: "sheet" }, (body) => this.signed(body));
  }

  /** An act as an envelope, with the number that comes next. */
  says(act: Said): Envelope {
    const own = { id: v7(), author: this.person, capturedAt: at, clockOffsetMs: 0, reason: null };
    return this.writer.written({ ...own, ...act } as WrittenAct);
  }

  reads(slot: Slot, payload: EventOf<"record">["payload"], more: Partial<Said> = {}): Envelope {
    return this.says({ type: "record", reading: randomUUID(), base: null, slot, payload, source: "station", ...more } as Said);
  }

  orders(type: "move.open" | "move.close", move: number): Envelope {
    return this.says({ type, ...noReading, payload: { move, repeat: 1 } } as Said);
  }

  sends(events: readonly Envelope[], when = at): SyncAnswer {
    return takeEvents(this.db, { device: this.device, holds: events.length, events: [...events] }, { account: this.person, at: when });
  }

  signed(body: string): string {
    return sign("sha256", Buffer.from(body, "utf8"), { key: this.key, dsaEncoding: "ieee-p1363" }).toString("base64url");
  }
}

export function idOf({ body }: Envelope): string {
  return (JSON.parse(body) as { id: string }).id;
}

export function readingOf({ body }: Envelope): string {
  return (JSON.parse(body) as { reading: string }).reading;
}
