import type { ChainRefusal } from "@/lib/ledger/hash-chain";

/** Why an entry of a chain does not fit, or an event has none; `serverSeq` is the number under which the server took an event in. */
export type LedgerFault =
  | ChainRefusal
  | { readonly type: "EventMissing"; readonly seq: number; readonly serverSeq: number }
  | { readonly type: "EventChanged"; readonly seq: number; readonly serverSeq: number }
  | { readonly type: "SignatureBad"; readonly seq: number; readonly serverSeq: number }
  | { readonly type: "EventNotEntered"; readonly seq: null; readonly serverSeq: number };

/** What does not fit in a ledger, without its full stop. */
export function ledgerFaultClause(fault: LedgerFault): string {
  switch (fault.type) {
    case "ChainOutOfOrder":
      return `entry ${fault.seq} stands where entry ${fault.expected} is due`;
    case "ChainBroken":
      return `entry ${fault.seq} does not follow on the entry before it`;
    case "EntryChanged":
      return `entry ${fault.seq} is not what was written`;
    case "EventMissing":
      return `entry ${fault.seq} speaks of event ${fault.serverSeq}, which is gone`;
    case "EventChanged":
      return `entry ${fault.seq} speaks of event ${fault.serverSeq}, whose text is another now`;
    case "SignatureBad":
      return `entry ${fault.seq} speaks of event ${fault.serverSeq}, whose signature does not fit its phone's key`;
    case "EventNotEntered":
      return `event ${fault.serverSeq} has no entry in any chain`;
  }
}

const acts: Readonly<Record<string, string>> = {
  record: "Reading",
  correct: "Correction",
  void: "Reading taken back",
  resolve: "Disagreement settled",
  assign: "Event given a place",
  release: "Event let in",
  "event.set-aside": "Event set aside",
  "move.open": "Move opened",
  "move.close": "Move closed",
  "move.repeat": "Move ordered again",
  "move.exclude": "Move left out",
  "station.series": "New series of a station",
  "session.open": "Session opened",
  "session.close": "Session closed",
  "device.writeOff": "Phone written off",
  attest: "Attested by a witness",
  "plan.save": "Plan changed",
  "test.create": "Test made",
  "test.state": "State of the test changed",
  "account.create": "Account made",
  "account.password": "Password set",
  "account.standing": "Standing of an account changed",
  "password.link": "Link for a password made",
  "device.register": "Phone made known",
  "device.revoke": "Phone stopped",
  "role.grant": "Role given",
  "role.end": "Role ended",
  "enrolment.make": "Code made for a phone",
  "enrolment.use": "Phone enrolled",
  "enrolment.revoke": "Code taken back",
  "record.import": "Record file read in",
  "record.export": "Record file given out",
  restored: "Server restored from a backup",
};

/** What an entry of the ledger stands for; an act without words of its own is named as it is written. */
export function ledgerActName(what: string): string {
  return acts[what] ?? what;
}
