import { projectionOf, rebuildProjection } from "@/db/server/rebuild-projection";
import { isLedgerKept, verifiedLedger } from "@/db/server/verify-ledger";
import { type Noise, seededNoise } from "@/lib/numerics/seeded-noise";
import { FaultCrew } from "./fault-crew";
import { FaultServer } from "./fault-server";

/** What a run has seen: everything but `events` and `faults` must be zero. */
export type FaultCount = {
  readonly events: number;
  readonly faults: Readonly<Record<string, number>>;
  readonly lost: number;
  /** called confirmed, and gone after a restore from the last backup */
  readonly falselyConfirmed: number;
  readonly doubled: number;
  readonly stuck: number;
  readonly setAside: number;
  readonly unverified: number;
  readonly projectionOff: number;
};

/**
 * One day of readings under faults: phones read and send over lines on which things go wrong, the server is stopped, torn and
 * restored from an older backup. Then it heals: every phone sends until it is quiet, and everything is counted.
 */
export async function faultRun(seed: number, steps: number): Promise<FaultCount> {
  const chance = seededNoise(seed);
  const server = new FaultServer();
  try {
    const crew = await FaultCrew.make(server, chance);
    const faults: Record<string, number> = {};
    const tell = (fault: string) => {
      faults[fault] = (faults[fault] ?? 0) + 1;
    };
    await server.backUp();
    let falselyConfirmed = 0;
    for (let step = 0; step < steps; step++) falselyConfirmed += await oneStep(crew, server, chance, tell);
    const stuck = await crew.settles();
    return { ...counted(server, crew), faults, stuck, falselyConfirmed };
  } finally {
    server.remove();
  }
}

async function oneStep(crew: FaultCrew, server: FaultServer, chance: Noise, tell: (fault: string) => void): Promise<number> {
  crew.reads();
  if (chance.uniform() < 0.5) await crew.sends(0.6, tell);
  if (chance.uniform() < 0.05) {
    crew.onePhoneCrashes();
    tell("phone killed while sending");
  }
  if (chance.uniform() < 0.02) await server.backUp();
  if (chance.uniform() >= 0.01) return 0;
  await server.restore();
  tell("server restored from an older backup");
  return confirmedButGone(server, crew);
}

function confirmedButGone(server: FaultServer, crew: FaultCrew): number {
  const held = new Set(server.db.$client.prepare("select id from events where id is not null").pluck().all());
  return crew.phones.flatMap(({ events }) => events.filter(({ id, state }) => state === "confirmed" && !held.has(id))).length;
}

function counted(server: FaultServer, crew: FaultCrew): Omit<FaultCount, "faults" | "stuck" | "falselyConfirmed"> {
  const { db } = server;
  const taking = new Map<string, number>();
  for (const { id } of db.$client.prepare("select id from events where outcome <> 'quarantined'").all() as { id: string }[]) {
    taking.set(id, (taking.get(id) ?? 0) + 1);
  }
  const ids = crew.phones.flatMap(({ events }) => events.map(({ id }) => id));
  const before = projectionOf(db, crew.test);
  rebuildProjection(db, crew.test);
  return {
    events: ids.length,
    lost: ids.filter((id) => !taking.has(id)).length,
    doubled: [...taking.values()].filter((count) => count > 1).length + (new Set(ids).size - ids.length),
    setAside: crew.phones.flatMap(({ events }) => events.filter(({ state }) => state === "quarantined")).length,
    unverified: isLedgerKept(verifiedLedger(db)) ? 0 : 1,
    projectionOff: JSON.stringify(projectionOf(db, crew.test)) === JSON.stringify(before) ? 0 : 1,
  };
}
