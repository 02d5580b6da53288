import { mkdirSync, mkdtempSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { POST } from "@/app/api/v1/sync/route";
import type { Account } from "@/db/server/accounts";
import { type Database, database } from "@/db/server/connection";
import { noReading } from "@/db/server/event-writer";
import type { Role } from "@/lib/sync/job-sheet";
import { type Envelope, PROTOCOL, type SyncAnswer, syncAnswerSchema } from "@/lib/sync/protocol";
import type { Slot } from "@/lib/sync/slot";
import { cookieOf } from "../app/visitors";
import { Phone } from "../db/server/phone";
import { personWith, type Yard, yardIn } from "../db/server/yard";

const stations = ["A", "B", "C"];
const moves = 9;
const repeats = 200;

/** A phone with the session of its person. */
export type Hand = { readonly phone: Phone; readonly cookie: string };

/** The real route handlers over a database on the disk, in a folder of its own. */
export class BenchServer {
  private readonly base = mkdtempSync(path.join(tmpdir(), "battenbook-bench-"));
  private readonly yard: Yard;

  constructor() {
    process.env.BATTENBOOK_DATA = path.join(this.base, "data");
    mkdirSync(this.copies);
    this.yard = yardIn(database());
    const lead = new Phone(this.db, this.test, personWith(this.yard, "lead", "Ragna").id);
    // so many readings due that none of them fills up as it never would on a ship
    const ordered = Array.from({ length: moves }, (_, move) =>
      lead.says({ type: "move.repeat", ...noReading, payload: { move, repeat: repeats }, reason: "bench" }),
    );
    lead.sends(ordered);
  }

  get db(): Database {
    return database();
  }

  get test(): string {
    return this.yard.test;
  }

  /** A folder for copies, on the same disk. */
  get copies(): string {
    return path.join(this.base, "copies");
  }

  async hand(role: Role = "reader"): Promise<Hand> {
    const person: Account = personWith(this.yard, role);
    return { phone: new Phone(this.db, this.test, person.id), cookie: await cookieOf(person) };
  }

  /** One batch by the route; what is not answered as the protocol says ends the bench. */
  async sent({ phone, cookie }: Hand, events: readonly Envelope[]): Promise<SyncAnswer> {
    const body = JSON.stringify({ protocol: PROTOCOL, device: phone.device, holds: events.length, events });
    const answer = await POST(new Request("http://localhost/api/v1/sync", { method: "POST", body, headers: { cookie } }));
    return syncAnswerSchema.parse(await answer.json());
  }

  remove(): void {
    const shared = globalThis as { battenbookDatabase?: Database };
    shared.battenbookDatabase?.$client.close();
    shared.battenbookDatabase = undefined;
    rmSync(this.base, { recursive: true, force: true });
  }
}

/** Readings as a phone has them saved: signed, one after the other round the ship. */
export function readingsOf({ phone }: Hand, count: number, start = 0): Envelope[] {
  return Array.from({ length: count }, (_, i) => phone.reads(slotOf(start + i), { mode: "settled", valuesMm: [100 + (i % 40) / 10] }));
}

export function inBatches<T>(list: readonly T[], size: number): T[][] {
  return Array.from({ length: Math.ceil(list.length / size) }, (_, i) => list.slice(i * size, (i + 1) * size));
}

/** The value that this share of the values does not exceed. */
export function percentile(values: readonly number[], share: number): number {
  const sorted = [...values].sort((a, b) => a - b);
  return sorted[Math.min(sorted.length - 1, Math.ceil(share * sorted.length) - 1)] ?? Number.NaN;
}

function slotOf(i: number): Slot {
  const station = stations[i % stations.length] ?? "";
  const turn = Math.floor(i / stations.length);
  return { kind: "batten", move: turn % moves, repeat: 1 + (Math.floor(turn / moves) % repeats), station, series: 1 };
}
