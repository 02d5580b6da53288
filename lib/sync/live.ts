import type { TestRecord } from "@/lib/record/test-record";
import type { ReadingValue } from "./event";
import type { Role, TestState } from "./job-sheet";
import type { Slot } from "./slot";

/** `GET /api/v1/tests/:id/live`: what lead, engineer and witness see of a running test. Readers are refused. */
export type LiveSnapshot = {
  /** server sequence of the last event taken in; the stream resumes after it */
  readonly cursor: number;
  readonly epoch: string;
  readonly state: TestState;
  readonly record: TestRecord;
  readonly phones: readonly Phone[];
  readonly due: readonly ReadingDue[];
  readonly moves: readonly MoveProgress[];
  readonly quarantined: readonly Quarantined[];
  readonly ledgerHead: string;
};

export type Phone = {
  readonly device: string;
  readonly name: string;
  readonly person: string;
  readonly roles: readonly Role[];
  readonly revoked: boolean;
  readonly lastHeardAt: string | null;
  /** events it says it still holds */
  readonly holds: number;
  /** "41 taken, 39 received" */
  readonly highestSeq: number;
  readonly received: number;
  readonly missing: readonly number[];
  /** why nobody waits for what is missing; null: it is awaited */
  readonly writtenOff: string | null;
};

export type SlotState = "empty" | "read" | "disagrees" | "resolved";

export type ReadingDue = {
  readonly slot: Slot;
  readonly slotKey: string;
  readonly state: SlotState;
  readonly readings: readonly StandingReading[];
  /** the acts a resolve has to name to settle the slot */
  readonly heads: readonly string[];
};

/** One head standing in a slot. */
export type StandingReading = {
  readonly event: string;
  readonly reading: string;
  readonly value: ReadingValue;
  readonly source: "station" | "radio" | "paper";
  readonly status: "accepted" | "superseded" | "void" | "disagrees";
  readonly author: string;
  readonly device: string;
  readonly capturedAt: string;
  readonly receivedAt: string;
  readonly late: boolean;
  readonly capturedAfterClose: boolean;
  readonly corrected: boolean;
  /** taken with this value; left out where none was */
  readonly photographs?: readonly StandingPhotograph[];
};

/** A photograph that an event names; its bytes may come later. */
export type StandingPhotograph = { readonly sha256: string; readonly hasArrived: boolean };

export type MoveProgress = {
  readonly no: number;
  readonly label: string;
  readonly repeat: number;
  readonly state: "due" | "open" | "closed" | "disagrees";
  readonly excluded: string | null;
  readonly openedAt: string | null;
  readonly closedAt: string | null;
};

export type Quarantined = {
  readonly event: string | null;
  readonly serverSeq: number;
  readonly device: string;
  readonly code: string;
  readonly message: string;
};
