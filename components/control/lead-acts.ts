import type { EventOf, ReadingValue } from "@/lib/sync/event";
import type { StandingReading } from "@/lib/sync/live";
import type { Slot } from "@/lib/sync/slot";

export type Choice = EventOf<"resolve">["payload"];
export type MoveRun = { readonly no: number; readonly repeat: number };

/** What the lead does at the control page; each is one event, saved on this device first and sent when the server is there. */
export type LeadActs = {
  readonly openMove: (move: MoveRun) => Promise<void>;
  readonly closeMove: (move: MoveRun) => Promise<void>;
  readonly repeatMove: (move: MoveRun) => Promise<void>;
  readonly excludeMove: (move: MoveRun, reason: string) => Promise<void>;
  readonly record: (slot: Slot, value: ReadingValue, source: "station" | "radio" | "paper") => Promise<void>;
  readonly correct: (standing: StandingReading, slot: Slot, value: ReadingValue, reason: string) => Promise<void>;
  readonly resolve: (heads: readonly string[], slot: Slot, choice: Choice, reason: string) => Promise<void>;
  readonly takeBack: (standing: StandingReading, slot: Slot, reason: string) => Promise<void>;
  readonly assign: (event: string, slot: Slot, reason: string) => Promise<void>;
  readonly writeOff: (device: string, reason: string) => Promise<void>;
  readonly release: (event: string, reason: string) => Promise<void>;
};
