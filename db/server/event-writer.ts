import { canonicalJson } from "@/lib/ledger/canonical-json";
import type { EventBody } from "@/lib/sync/event";
import type { Envelope } from "@/lib/sync/protocol";

type Numbered = "v" | "seq" | "device" | "test" | "jobTag";

/** What one act says; the writer adds device, number, test and job sheet. */
export type WrittenAct = EventBody extends infer E ? (E extends EventBody ? Omit<E, Numbered> : never) : never;

/** An act of the wheelhouse that fills no slot. */
export const noReading = { reading: null, base: null, slot: null, source: null } as const;

type Device = { readonly device: string; readonly test: string; readonly jobTag: string };

/** Signs the exact text of an event; null where the device has no key. */
export type Signature = (body: string) => string | null;

/** Writes the acts of one device, numbered without gaps from 1, in their one canonical text. */
export class EventWriter {
  private seq = 0;

  constructor(
    private readonly from: Device,
    private readonly signature: Signature = () => null,
  ) {}

  /** The next envelope of this device. */
  written(act: WrittenAct): Envelope {
    this.seq += 1;
    const body = canonicalJson({ v: 1, seq: this.seq, ...this.from, ...act });
    return { body, signature: this.signature(body) };
  }
}
