import { and, desc, eq } from "drizzle-orm";
import { canonicalJson } from "@/lib/ledger/canonical-json";
import { sha256Hex } from "@/lib/ledger/sha256";
import type { TestRecord } from "@/lib/record/test-record";
import { answer, promised, type Result, refuse } from "@/lib/result";
import { ledgerEntries } from "../schema/ledger";
import { slots } from "../schema/readings";
import { createAccount } from "./accounts";
import type { Act } from "./act";
import { type Database, inTransaction } from "./connection";
import { noteHolder, registerDevice } from "./devices";
import { EventWriter } from "./event-writer";
import {
  type Authors,
  acceptedBySlot,
  actId,
  type ImportAct,
  meanAct,
  movesToActs,
  readingsToActs,
  seriesToActs,
  withdrawalsToActs,
} from "./import-acts";
import { writeEntry } from "./ledger-entries";
import { present } from "./plan-rows";
import { grantRole } from "./role-grants";
import type { SheetWords } from "./sheet-words";
import { takeEvents } from "./take-events";
import { planOf, savePlan } from "./test-plan";
import { changeState, createTest, testById } from "./tests";
import { createVessel, sameVessel } from "./vessels";

export type ImportFault = { readonly path: string; readonly message: string };
export type ImportRefusal = { readonly type: "RecordRefused"; readonly faults: readonly ImportFault[] };
export type Imported = { readonly test: string; readonly isNew: boolean };

/**
 * Takes a whole test in: vessel, plan, and every reading as an event of a device that stands for the file, so that ledger
 * and projection hold it like any other. The same file again changes nothing.
 *
 * Refused as a whole, with the place in the document: another file of a test that is here already; one move in two
 * sessions; a reading that the plan has no place for.
 */
export function importRecord(db: Database, record: TestRecord, act: Act & { by: string }): Result<Imported, ImportRefusal> {
  const hash = sha256Hex(canonicalJson(record));
  if (testById(db, record.test.id)) return knownAlready(db, record, hash);
  const faults = faultsOfMoves(record);
  if (faults.length > 0) return refuse({ type: "RecordRefused", faults });
  try {
    inTransaction(db, () => takeIn(db, record, hash, act));
    return answer({ test: record.test.id, isNew: true });
  } catch (error) {
    // everything written so far is undone: no half of a test stays behind
    if (error instanceof NoPlaceFor) return refuse({ type: "RecordRefused", faults: error.faults });
    throw error;
  }
}

class NoPlaceFor extends Error {
  constructor(readonly faults: readonly ImportFault[]) {
    super("the record holds what has no place in its plan");
  }
}

function knownAlready(db: Database, { test }: TestRecord, hash: string): Result<Imported, ImportRefusal> {
  const entry = db
    .select()
    .from(ledgerEntries)
    .where(and(eq(ledgerEntries.chain, test.id), eq(ledgerEntries.what, "record.import")))
    .orderBy(desc(ledgerEntries.seq))
    .get();
  if (entry?.contentHash === hash) return answer({ test: test.id, isNew: false });
  const message = "this test is on this server already, and this file is another than the one it came from; nothing was changed";
  return refuse({ type: "RecordRefused", faults: [{ path: "test.id", message }] });
}

// readings due know a move by its number alone
function faultsOfMoves({ moves }: TestRecord): ImportFault[] {
  const sessions = new Map<number, number>();
  return moves.flatMap(({ no, session = 1 }, i) => {
    const first = sessions.get(no) ?? session;
    sessions.set(no, first);
    return first === session
      ? []
      : [{ path: `moves[${i}].no`, message: `move ${no} stands in session ${first} already: number the moves of all sessions on` }];
  });
}

function takeIn(db: Database, record: TestRecord, hash: string, act: Act & { by: string }): void {
  const { id, title, date, place, note } = record.test;
  const { vessel, hydrostatics, draftMarks, freeboardMarks, tanks, previous } = record;
  const copy = { vessel, hydrostatics, draftMarks, tanks, ...present({ freeboardMarks, previous }) };
  const ship = sameVessel(db, copy) ?? createVessel(db, copy, act);
  promised(createTest(db, ship, { id, title, date, place, timeZone: "UTC", ...present({ note }) }, act));
  writeEntry(db, id, { ...act, what: "record.import", contentHash: hash });
  grantRole(db, { test: id, account: act.by, role: "engineer" }, act);
  promised(savePlan(db, id, planOf({ ...record, moves: lastRuns(record) }), wordsFrom(record), act));
  const isRead = takeReadings(db, record, act);
  if (!isRead) return;
  promised(changeState(db, id, "open", act));
  promised(changeState(db, id, "closed", act));
}

function takeReadings(db: Database, record: TestRecord, act: Act & { by: string }): boolean {
  const device = actId(record.test.id, "import");
  promised(registerDevice(db, { device, name: "Record file", publicKey: null }, act.by, act));
  const writer = new EventWriter({ device, test: record.test.id, jobTag: "import" });
  const authors = authorsOf(db, record, device, act);
  const send = (acts: readonly ImportAct[]) => sent(db, acts, writer, device, act);
  send([...movesToActs(record, authors), ...seriesToActs(record, authors)]);
  const readings = readingsToActs(record, authors);
  send(readings);
  send(withdrawalsToActs(record, authors));
  send(disagreementsSettled(db, record, authors));
  return readings.length > 0;
}

function sent(db: Database, acts: readonly ImportAct[], writer: EventWriter, device: string, act: Act & { by: string }): void {
  const events = acts.map((one) => writer.written(one.act));
  const { results } = takeEvents(db, { device, holds: 0, events }, { account: act.by, at: act.at });
  const faults = results.flatMap(({ outcome, message }, i) =>
    outcome === "quarantined" ? [{ path: acts[i]?.path ?? "", message: message ?? "has no place in the plan" }] : [],
  );
  if (faults.length > 0) throw new NoPlaceFor(faults);
}

/** Slots that disagree here although the record counts several readings in them. */
function disagreementsSettled(db: Database, record: TestRecord, authors: Authors): ImportAct[] {
  const accepted = acceptedBySlot(record);
  const open = db
    .select()
    .from(slots)
    .where(and(eq(slots.test, record.test.id), eq(slots.state, "disagrees")))
    .all();
  return open.flatMap(({ slotKey, heads }) => {
    const counted = accepted.get(slotKey) ?? [];
    return counted.length < 2 ? [] : [{ act: meanAct(record, slotKey, heads, authors), path: counted[0]?.path ?? "" }];
  });
}

/** An account for every reader the record names: closed from the start, nobody signs in with it. */
function authorsOf(db: Database, record: TestRecord, device: string, act: Act & { by: string }): Authors {
  const { battens, drafts, freeboards = [], soundings, water, conditions = [] } = record.readings;
  const all = [...battens, ...drafts, ...freeboards, ...soundings, ...water, ...conditions];
  const named = new Map<string, string>();
  for (const { reader } of all) {
    if (reader === undefined || named.has(reader)) continue;
    const isRelay = all.some((one) => one.reader === reader && (one.source ?? "station") !== "station");
    const account = accountFor(db, record.test.id, reader, isRelay ? "lead" : "reader", act);
    noteHolder(db, device, account);
    named.set(reader, account);
  }
  return { importer: act.by, of: (reader) => named.get(reader ?? "") ?? act.by };
}

function accountFor(db: Database, test: string, name: string, role: "lead" | "reader", act: Act): string {
  const account = { id: actId(test, `person ${name}`), name, email: null, passwordHash: null, closedAt: act.at };
  const { id } = promised(createAccount(db, account, act));
  grantRole(db, { test, account: id, role }, act);
  return id;
}

/** Of several runs of one move the last stands in the plan. */
function lastRuns({ moves }: TestRecord): TestRecord["moves"] {
  return moves.filter((move, i) => !moves.some((other, j) => other.no === move.no && isLater(other.repeat ?? 1, move.repeat ?? 1, j, i)));
}

function isLater(repeat: number, than: number, place: number, thanPlace: number): boolean {
  return repeat > than || (repeat === than && place > thanPlace);
}

/** The record has no words for readers, but tells where water was drawn and which rounds there were. */
function wordsFrom({ readings }: TestRecord): SheetWords {
  const water = new Map(readings.water.map(({ place, depth }) => [`${place} ${depth}`, { place, depth }]));
  const after = [...readings.drafts, ...(readings.freeboards ?? []), ...readings.soundings, ...readings.water].some(
    ({ round }) => round === "after",
  );
  return { stations: {}, marks: {}, moves: {}, water: [...water.values()], rounds: after ? ["before", "after"] : ["before"] };
}
