import { and, asc, eq, inArray } from "drizzle-orm";
import { type EventBody, eventBodySchema } from "@/lib/sync/event";
import { type DuePlan, type Ordered, ordered } from "@/lib/sync/readings-due";
import { events } from "../schema/events";
import { planSettings, planWaterPlaces } from "../schema/plan";
import { placedEvents } from "../schema/readings";
import type { Database } from "./connection";
import { planRecord } from "./test-plan";
import { isTestKnown } from "./tests";

const keptPlans = new WeakMap<Database, Map<string, DuePlan>>();

/** While the work is done, inside a transaction, nobody else can change a plan: each is read once. */
export function withPlansKept<T>(db: Database, work: () => T): T {
  keptPlans.set(db, new Map());
  try {
    return work();
  } finally {
    keptPlans.delete(db);
  }
}

/** Which readings are due in a test: its plan, and what the wheelhouse has ordered since. Undefined: no such test here. */
export function duePlan(db: Database, test: string): { plan: DuePlan; ordered: Ordered } | undefined {
  const plan = planIn(db, test);
  return plan && { plan, ordered: ordered(plan, ordersOf(db, test)) };
}

function planIn(db: Database, test: string): DuePlan | undefined {
  const kept = keptPlans.get(db)?.get(test);
  if (kept || !isTestKnown(db, test)) return kept;
  const plan = { ...planRecord(db, test), waterPlaces: waterPlaces(db, test), rounds: rounds(db, test) };
  keptPlans.get(db)?.set(test, plan);
  return plan;
}

function waterPlaces(db: Database, test: string): DuePlan["waterPlaces"] {
  return db
    .select({ place: planWaterPlaces.where, depth: planWaterPlaces.depth })
    .from(planWaterPlaces)
    .where(eq(planWaterPlaces.test, test))
    .orderBy(asc(planWaterPlaces.place))
    .all();
}

function rounds(db: Database, test: string): DuePlan["rounds"] {
  return (
    db.select({ rounds: planSettings.rounds }).from(planSettings).where(eq(planSettings.test, test)).get()?.rounds ?? ["before", "after"]
  );
}

function ordersOf(db: Database, test: string): EventBody[] {
  return db
    .select({ body: events.body })
    .from(placedEvents)
    .innerJoin(events, eq(events.serverSeq, placedEvents.serverSeq))
    .where(and(eq(placedEvents.test, test), inArray(placedEvents.type, ["move.repeat", "station.series"])))
    .all()
    .map(({ body }) => eventBodySchema.parse(JSON.parse(body)));
}
