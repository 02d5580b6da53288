import type { MoveProgress, Phone, ReadingDue } from "./live";

/** What keeps a test from being called reconciled. */
export type OwedBeforeReconciled =
  | { readonly type: "OpenDisagreement"; readonly slotKey: string }
  | { readonly type: "MoveInDispute"; readonly move: number }
  | { readonly type: "UnexplainedGap"; readonly device: string; readonly missing: number };

type Standing = {
  readonly due: readonly Pick<ReadingDue, "slot" | "slotKey" | "state">[];
  readonly moves: readonly Pick<MoveProgress, "no" | "repeat" | "state">[];
  readonly phones: readonly Pick<Phone, "device" | "missing" | "writtenOff">[];
};

/**
 * Everything that is still owed before a test can be called reconciled: disagreements that count, moves on which two leads
 * differ, and numbers of phones that never arrived and that nobody has explained.
 */
export function owedBeforeReconciled({ due, moves, phones }: Standing): readonly OwedBeforeReconciled[] {
  const open = due.filter((each) => each.state === "disagrees" && !isReadAgain(moves, each));
  const disputed = moves.filter(({ state }) => state === "disagrees");
  const gaps = phones.filter(({ missing, writtenOff }) => missing.length > 0 && writtenOff === null);
  return [
    ...open.map(({ slotKey }) => ({ type: "OpenDisagreement" as const, slotKey })),
    ...disputed.map(({ no }) => ({ type: "MoveInDispute" as const, move: no })),
    ...gaps.map(({ device, missing }) => ({ type: "UnexplainedGap" as const, device, missing: missing.length })),
  ];
}

/** A move that was ordered again counts by its last repeat only: what an earlier one left open is open no more. */
export function isReadAgain(moves: Standing["moves"], { slot }: Pick<ReadingDue, "slot">): boolean {
  return slot.kind === "batten" && moves.some((move) => move.no === slot.move && move.repeat > slot.repeat);
}
