import type { Noise } from "@/lib/numerics/seeded-noise";
import type { Slot } from "@/lib/sync/slot";
import { cookieOf } from "../app/visitors";
import { idOf, Phone, readingOf } from "../db/server/phone";
import { personWith, yardIn } from "../db/server/yard";
import { FaultPhone } from "./fault-phone";
import type { FaultServer } from "./fault-server";
import { faultyLine } from "./faulty-line";

type Hand = { readonly writer: Phone; readonly phone: FaultPhone; readonly cookie: string; readonly own: ReturnType<Phone["says"]>[] };

/** Two readers and a lead with their phones, reading at a few stations and correcting themselves now and then. */
export class FaultCrew {
  private constructor(
    readonly test: string,
    private readonly server: FaultServer,
    private readonly chance: Noise,
    private readonly hands: readonly Hand[],
  ) {}

  static async make(server: FaultServer, chance: Noise): Promise<FaultCrew> {
    const yard = yardIn(server.db);
    const hands = await Promise.all(
      (["reader", "reader", "lead"] as const).map(async (role, i) => {
        const person = personWith(yard, role, `${role} ${i}`);
        const writer = new Phone(server.db, yard.test, person.id);
        return { writer, phone: new FaultPhone(writer.device), cookie: await cookieOf(person), own: [] };
      }),
    );
    return new FaultCrew(yard.test, server, chance, hands);
  }

  get phones(): readonly FaultPhone[] {
    return this.hands.map(({ phone }) => phone);
  }

  /** Somebody reads, corrects, or takes back. */
  reads(): void {
    const hand = this.oneOf(this.hands);
    const base = hand.own.length > 0 && this.chance.uniform() < 0.25 ? hand.own.pop() : undefined;
    const event = base ? this.changed(hand, base) : hand.writer.reads(this.slot(), { mode: "settled", valuesMm: [this.figure()] });
    if (!event.body.includes('"type":"void"')) hand.own.push(event);
    hand.phone.save(event);
  }

  async sends(share: number, tell: (fault: string) => void): Promise<void> {
    const { phone, cookie } = this.oneOf(this.hands);
    await phone.sends(faultyLine({ server: this.server, cookie, chance: this.chance }, share, tell));
  }

  onePhoneCrashes(): void {
    this.oneOf(this.hands).phone.crashes();
  }

  /** The line is good again: every phone sends until it has nothing left. What is left after that is stuck. */
  async settles(): Promise<number> {
    const nothing = () => undefined;
    for (let round = 0; round < 200; round++) {
      for (const { phone, cookie } of this.hands) {
        await phone.sends(faultyLine({ server: this.server, cookie, chance: this.chance }, 0, nothing));
      }
      // a quiet round asks once more: the server may miss what it had
      if (round > 1 && this.phones.every(({ unsent }) => unsent === 0)) break;
    }
    return this.phones.reduce((sum, { unsent }) => sum + unsent, 0);
  }

  private changed({ writer }: Hand, base: Hand["own"][number]) {
    const { slot } = JSON.parse(base.body) as { slot: Slot };
    const on = { reading: readingOf(base), base: idOf(base), slot };
    if (this.chance.uniform() < 0.3) return writer.says({ type: "void", ...on, payload: {}, source: null, reason: "misread" });
    return writer.says({ type: "correct", ...on, payload: { mode: "settled", valuesMm: [this.figure()] }, source: "station" });
  }

  private slot(): Slot {
    const station = this.oneOf(["A", "B", "C"]);
    return { kind: "batten", move: this.oneOf([0, 1, 2, 3]), repeat: 1, station, series: 1 };
  }

  private figure(): number {
    return Math.round(200 * this.chance.uniform()) / 2;
  }

  private oneOf<T>(list: readonly T[]): T {
    return list[Math.floor(this.chance.uniform() * list.length)] as T;
  }
}
