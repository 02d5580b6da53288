import { and, eq, isNull, max } from "drizzle-orm";
import type { LiveSnapshot, MoveProgress, Quarantined } from "@/lib/sync/live";
import { type MoveRun, moveProgress } from "@/lib/sync/move-progress";
import { events } from "../schema/events";
import { placedEvents } from "../schema/readings";
import type { Database } from "./connection";
import { ledgerHead } from "./ledger-entries";
import { livePhones } from "./live-phones";
import { liveReadingsDue } from "./live-readings-due";
import { moveEvents } from "./orders";
import { recordOf } from "./record-as-it-stands";
import { identityOf } from "./server-identity";
import { sheetWords } from "./sheet-words";
import { testById } from "./tests";

/** What lead, engineer and witness see of a running test; null: no such test here. */
export function liveSnapshot(db: Database, test: string, at: string): LiveSnapshot | null {
  const state = testById(db, test)?.state;
  if (!state) return null;
  const record = recordOf(db, test);
  const runs = moveProgress(
    record.moves.map(({ no }) => no),
    moveEvents(db, test),
  );
  return {
    cursor: cursorOf(db, test),
    epoch: identityOf(db).epoch,
    state,
    record,
    phones: livePhones(db, test, at),
    due: liveReadingsDue(db, test, runs),
    moves: record.moves.map(({ no, repeat = 1 }) => moveNow(no, repeat, runs, sheetWords(db, test).moves[no])),
    quarantined: quarantined(db, test),
    ledgerHead: ledgerHead(db, test),
  };
}

/** The number of the last event of a test that this server has taken in. */
export function cursorOf(db: Database, test: string): number {
  const last = db
    .select({ value: max(events.serverSeq) })
    .from(events)
    .where(eq(events.test, test))
    .get();
  return last?.value ?? 0;
}

/** A move in its last repeat. */
function moveNow(no: number, repeat: number, runs: readonly MoveRun[], label: string | undefined): MoveProgress {
  const run = runs.find((each) => each.move === no && each.repeat === repeat);
  const { state = "due", excluded = null, openedAt = null, closedAt = null } = run ?? {};
  return { no, repeat, label: label ?? (no === 0 ? "Reference" : `Move ${no}`), state, excluded, openedAt, closedAt };
}

/** What was set aside and has not been let in since; among it what came before its base and may not stand on it. */
function quarantined(db: Database, test: string): Quarantined[] {
  const { id, serverSeq, device, code, message } = events;
  const rows = db
    .select({ event: id, serverSeq, device, code, message })
    .from(events)
    .leftJoin(placedEvents, eq(placedEvents.serverSeq, serverSeq))
    .where(and(eq(events.test, test), isNull(placedEvents.event)))
    .orderBy(serverSeq)
    .all();
  return rows.map(({ code: kind, message: told, ...row }) => ({
    ...row,
    code: kind ?? "role-not-held",
    message: told ?? "The author may not act on a reading of somebody else",
  }));
}
