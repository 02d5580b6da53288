import {
  afterAnswer,
  afterBackup,
  afterComparison,
  afterSilence,
  isUnsent,
  nextBatch,
  type QueuedEvent,
  type StateChange,
} from "@/lib/sync/outbox";
import { type Envelope, PROTOCOL, type Receipt, type SyncAnswer, syncAnswerSchema } from "@/lib/sync/protocol";

/** What came back: an answer of the protocol, or silence (nothing, an error, a page of somebody else's). */
export type Heard = SyncAnswer | null;

/** How a phone reaches its server; the text is what travels. */
export type Line = (text: string) => Promise<Heard>;

/** The queue of a phone as a plain object, under the rules that page and worker share. What it holds is on its disk. */
export class FaultPhone {
  private held: (QueuedEvent & { receipt: Receipt | null })[] = [];
  private epoch: string | null = null;
  /** everything that the server has answered for at some time */
  readonly acknowledged = new Set<string>();

  constructor(readonly device: string) {}

  get events(): readonly (QueuedEvent & { readonly receipt: Receipt | null })[] {
    return this.held;
  }

  get unsent(): number {
    return this.held.filter(isUnsent).length;
  }

  save(envelope: Envelope): void {
    const { id, seq } = JSON.parse(envelope.body) as { id: string; seq: number };
    this.held.push({ id, seq, state: "saved", envelope, receipt: null });
  }

  /** One request: the next batch, or an empty one that asks what the server has. */
  async sends(line: Line): Promise<void> {
    const batch = nextBatch(this.held);
    this.become(batch.map(({ id }) => ({ id, state: "sending", receipt: null })));
    const request = { protocol: PROTOCOL, device: this.device, holds: this.unsent, events: batch.map(({ envelope }) => envelope) };
    const heard = await line(JSON.stringify(request));
    if (heard === null) return this.crashes();
    const changes = afterAnswer(batch, heard);
    this.become(changes);
    const answered = new Set(changes.map(({ id }) => id));
    this.become(
      afterComparison(
        this.held.filter(({ id }) => !answered.has(id)),
        heard.device,
        this.epoch !== null && this.epoch !== heard.server.epoch,
      ),
    );
    this.become(afterBackup(this.held, heard.confirmedTo));
    this.epoch = heard.server.epoch;
    for (const { id, state } of this.held) if (state === "on-server" || state === "confirmed") this.acknowledged.add(id);
  }

  /** Killed while sending: nothing is known of what was on its way. */
  crashes(): void {
    this.become(afterSilence(this.held));
  }

  private become(changes: readonly StateChange[]): void {
    const byId = new Map(changes.map((change) => [change.id, change]));
    this.held = this.held.map((event) => {
      const change = byId.get(event.id);
      return change ? { ...event, state: change.state, receipt: change.receipt ?? event.receipt } : event;
    });
  }
}

/** An answer out of a response; a page, a redirect or an error is silence. */
export async function heardIn(response: Response): Promise<Heard> {
  if (response.status !== 200 || (response.headers.get("content-type") ?? "").includes("text/html")) return null;
  const answer = syncAnswerSchema.safeParse(await response.json().catch(() => null));
  return answer.success ? answer.data : null;
}
