import { expect, test } from "vitest";
import { isReadAgain, owedBeforeReconciled } from "@/lib/sync/reconciling";
import type { Slot } from "@/lib/sync/slot";

const batten = (move: number, repeat = 1): Slot => ({ kind: "batten", move, repeat, station: "A", series: 1 });
const move = (no: number, repeat = 1, state: "closed" | "disagrees" = "closed") => ({ no, repeat, state });
const phone = (missing: number[], writtenOff: string | null = null) => ({ device: "aft", missing, writtenOff });
const nothing = { due: [], moves: [move(0)], phones: [phone([])] };

test("nothing is owed where every reading agrees and every number has come", () => {
  const due = [{ slot: batten(0), slotKey: "a", state: "read" as const }];
  expect(owedBeforeReconciled({ ...nothing, due })).toEqual([]);
});

test("an open disagreement is owed, unless its move was ordered again", () => {
  const due = [{ slot: batten(2), slotKey: "a", state: "disagrees" as const }];
  expect(owedBeforeReconciled({ ...nothing, due, moves: [move(2)] })).toEqual([{ type: "OpenDisagreement", slotKey: "a" }]);
  expect(owedBeforeReconciled({ ...nothing, due, moves: [move(2, 2)] })).toEqual([]);
  expect(isReadAgain([move(2, 2)], { slot: { kind: "note" } })).toBe(false);
});

test("a move on which two leads differ is owed", () => {
  expect(owedBeforeReconciled({ ...nothing, moves: [move(3, 1, "disagrees")] })).toEqual([{ type: "MoveInDispute", move: 3 }]);
});

test("a gap is owed until the phone is written off", () => {
  expect(owedBeforeReconciled({ ...nothing, phones: [phone([4, 5])] })).toEqual([{ type: "UnexplainedGap", device: "aft", missing: 2 }]);
  expect(owedBeforeReconciled({ ...nothing, phones: [phone([4, 5], "fell overboard")] })).toEqual([]);
});
