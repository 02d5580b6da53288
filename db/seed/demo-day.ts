import { v5, v7 } from "uuid";
import { noReading, type WrittenAct } from "@/db/server/event-writer";
import type { TestRecord } from "@/lib/record/test-record";
import type { ReadingValue } from "@/lib/sync/event";
import { recordedReadings } from "@/lib/sync/recorded-reading";
import type { Slot } from "@/lib/sync/slot";
import { slotKey } from "@/lib/sync/slot-key";
import { type DemoDevice, holderOf } from "./demo-devices";

/** An act of the demo's day: on which device, when it was done, when the server heard of it. */
export type DemoAct = { readonly device: DemoDevice; readonly heardAt: string; readonly act: WrittenAct };

const movesDone = [0, 1, 2, 3, 4, 5];
const firstMoveAt = minutes("2026-05-04T08:30:00.000Z");
const betweenMoves = 14;
/** A gust from port while move 5 was read, felt by every station [tangent]. */
const gust = 1.2e-3;
const gustAtMove = 5;
/** What the visitor finds not read yet. */
const tanksLeft = ["GW", "BW-F"];

/**
 * The first half of the demo's day, as the server heard of it. Marks, most tanks and the water before the moves;
 * moves 0 to 5 read at all stations. Four things went as they do: two readers of one mark disagree, a gust at move 5,
 * station U's reading of move 4 arrives when that move is closed, and station C's of move 3 is called over the radio.
 */
export function demoDay(record: TestRecord, readings: TestRecord["readings"]): DemoAct[] {
  const all = recordedReadings(readings);
  const before = all.filter(
    ({ slot }) => "round" in slot && slot.round === "before" && !(slot.kind === "sounding" && tanksLeft.includes(slot.tank)),
  );
  const round = before.map(({ slot, value }, i) => reading(slot.kind === "water" ? "maras" : "nilss", slot, value, firstMoveAt - 60 + i));
  const battens = all.flatMap(({ slot, value }) =>
    slot.kind === "batten" && movesDone.includes(slot.move) ? [batten(record, slot, value)] : [],
  );
  const acts = [...round, secondLook(readings), ...movesDone.flatMap((no) => wheelhouse(record, no)), ...battens];
  return acts.sort((a, b) => (a.heardAt < b.heardAt ? -1 : a.heardAt > b.heardAt ? 1 : 0));
}

/** Mara reads the starboard mark forward as well, from the quay, and takes one figure for another. */
function secondLook({ drafts }: TestRecord["readings"]): DemoAct {
  const slot: Slot = { kind: "draft", mark: "FS", round: "before" };
  const value = drafts.find(({ mark, round }) => mark === slot.mark && round === slot.round)?.value ?? 0;
  return reading("maras", slot, { value: Math.round((value + 0.045) * 1000) / 1000 }, firstMoveAt - 31);
}

type BattenSlot = Extract<Slot, { kind: "batten" }>;

function batten(record: TestRecord, slot: BattenSlot, value: ReadingValue): DemoAct {
  const felt = slot.move === gustAtMove ? withGust(record, slot.station, value) : value;
  const at = moveAt(slot.move) + 4 + "ABCU".indexOf(slot.station);
  if (slot.move === 3 && slot.station === "C") return reading("wheelhouse", slot, felt, at, { source: "radio" });
  const isHeardLate = slot.move === 4 && slot.station === "U";
  return reading("AB".includes(slot.station) ? "nilss" : "maras", slot, felt, at, { heardAfter: isHeardLate ? 6 : 0 });
}

function withGust({ stations }: TestRecord, id: string, value: ReadingValue): ReadingValue {
  const station = stations.find((one) => one.id === id);
  const half = (mm: number) => Math.round(2 * mm) / 2;
  if (station?.instrument === "pendulum" && "valuesMm" in value) {
    return { ...value, valuesMm: value.valuesMm.map((mm) => half(mm + 1000 * station.length * gust)) };
  }
  if (station?.instrument === "u-tube" && "portMm" in value) {
    const rise = 500 * station.span * gust;
    return { ...value, portMm: value.portMm.map((mm) => half(mm - rise)), starboardMm: value.starboardMm.map((mm) => half(mm + rise)) };
  }
  return value;
}

/** What the lead does at one move: opens it, measures where the weights stand, notes the conditions, closes it. */
function wheelhouse({ moves }: TestRecord, no: number): DemoAct[] {
  const positions = Object.entries(moves.find((move) => move.no === no)?.positions ?? {});
  const measured = positions.map(([weight, place]) =>
    reading("wheelhouse", { kind: "position", weight, move: no }, { place }, moveAt(no) + 2),
  );
  return [order("move.open", no, moveAt(no)), ...measured, conditions(no), order("move.close", no, moveAt(no) + 10)];
}

function conditions(no: number): DemoAct {
  const wind = no === gustAtMove ? "gust from port while the bobs were read, about 11 m/s" : "light air, under 2 m/s";
  const value = { wind, underKeel: 3.4, moorings: "slack", headcount: 11, bobFree: true };
  return reading("wheelhouse", { kind: "condition", move: no }, value, moveAt(no) + 9);
}

function order(type: "move.open" | "move.close", move: number, minute: number): DemoAct {
  const payload = { move, repeat: 1 };
  return {
    device: "wheelhouse",
    heardAt: timeOf(minute),
    act: { type, ...noReading, payload, ...stamp("wheelhouse", `${type} ${move}`, minute) },
  };
}

type Told = { readonly source?: "station" | "radio"; readonly heardAfter?: number };

function reading(
  device: DemoDevice,
  slot: Slot,
  value: ReadingValue,
  minute: number,
  { source = "station", heardAfter = 0 }: Told = {},
): DemoAct {
  const what = `${device} ${slotKey(slot)}`;
  const act = {
    type: "record" as const,
    reading: v5(what, namespace),
    base: null,
    slot,
    payload: value,
    source,
    ...stamp(device, what, minute),
  };
  return { device, heardAt: timeOf(minute + heardAfter), act };
}

const namespace = "5ce44715-0000-4000-8000-000000000300";
const clockOffsets: Record<DemoDevice, number> = { wheelhouse: 0, maras: 340, nilss: -120 };

/** An id as a phone makes it at that moment, but always the same: the rest of it comes from what it stands for. */
function stamp(device: DemoDevice, what: string, minute: number) {
  const random = Uint8Array.from(Buffer.from(v5(what, namespace).replaceAll("-", ""), "hex"));
  const capturedAt = new Date(Date.parse(timeOf(minute)) - clockOffsets[device]).toISOString();
  const id = v7({ msecs: Date.parse(capturedAt), random });
  return { id, author: holderOf(device), capturedAt, clockOffsetMs: clockOffsets[device], reason: null };
}

function moveAt(no: number): number {
  return firstMoveAt + betweenMoves * no;
}

function minutes(time: string): number {
  return Date.parse(time) / 60_000;
}

function timeOf(minute: number): string {
  return new Date(minute * 60_000).toISOString();
}
