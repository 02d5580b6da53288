import { canonicalJson } from "@/lib/ledger/canonical-json";
import { sha256Hex } from "@/lib/ledger/sha256";
import type { TestRecord } from "@/lib/record/test-record";
import type { JobSheet } from "@/lib/sync/job-sheet";
import { moveProgress } from "@/lib/sync/move-progress";
import type { Ordered } from "@/lib/sync/readings-due";
import { accountById } from "./accounts";
import type { Database } from "./connection";
import { duePlan } from "./due-plan";
import { lengthOrdered, moveEvents } from "./orders";
import { rolesOf } from "./role-grants";
import { type SheetWords, sheetWords } from "./sheet-words";
import { planRecord } from "./test-plan";
import { testById } from "./tests";
import { gasDangerousTanks, markInWords } from "./words-of-plan";

export type IssuedSheet = { readonly sheet: JobSheet; readonly etag: string };

/**
 * Everything a phone needs for one test, for one person. It holds nobody's readings and no prediction.
 *
 * The tag is over the plan alone: it stands in every event captured by this sheet. The ETag is over everything but the
 * time of issue: it changes also when a move opens.
 */
export function jobSheetOf(db: Database, test: string, account: string, at: string): IssuedSheet | null {
  const person = accountById(db, account);
  const plan = planPart(db, test);
  const state = testById(db, test)?.state;
  if (!person || !plan || !state) return null;
  const tag = sha256Hex(canonicalJson(plan));
  const runs = moveProgress(
    plan.moves.map(({ no }) => no),
    moveEvents(db, test),
  );
  const stateOf = (no: number, repeat: number) => runs.find((run) => run.move === no && run.repeat === repeat)?.state ?? "due";
  const sheet = {
    ...plan,
    format: "battenbook-job" as const,
    tag,
    test: { ...plan.test, state },
    person: { id: person.id, name: person.name, roles: rolesOf(db, account, test, at) },
    moves: plan.moves.map((move) => ({ ...move, state: shownState(stateOf(move.no, move.repeat)) })),
  };
  return { sheet: { ...sheet, issuedAt: at }, etag: `"${sha256Hex(canonicalJson(sheet))}"` };
}

function planPart(db: Database, test: string) {
  const row = testById(db, test);
  const due = duePlan(db, test);
  if (!row || !due) return null;
  const { plan, ordered } = due;
  const words = sheetWords(db, test);
  const { id, title, date, place, timeZone, vesselCopy } = row;
  const { name, lbp } = vesselCopy.vessel;
  const dangerous = gasDangerousTanks(plan.tanks, words.gasDangerous);
  const markOnSheet = (mark: { id: string; x: number; y: number }) => ({
    id: mark.id,
    place: words.marks[mark.id] ?? markInWords(mark, lbp),
  });
  return {
    test: { id, title, date, place, timeZone },
    vessel: { name, lbp },
    stations: plan.stations.map((station) => stationOnSheet(db, test, station, ordered, words)),
    weights: plan.weights.map(({ id }) => ({ id })),
    moves: plan.moves.map(({ no }) => ({
      no,
      label: words.moves[no] ?? (no === 0 ? "Reference" : `Move ${no}`),
      repeat: ordered.repeats.get(no) ?? 1,
    })),
    draftMarks: plan.draftMarks.map(markOnSheet),
    freeboardMarks: (plan.freeboardMarks ?? []).map(markOnSheet),
    tanks: plan.tanks.map(({ id, contents, measure, shifts = false }) => ({
      id,
      contents,
      measure,
      gasDangerous: dangerous.has(id),
      shifts,
    })),
    water: words.water,
    hydrometers: (planRecord(db, test).hydrometers ?? []).map(({ id }) => id),
    rounds: words.rounds,
  };
}

type Station = TestRecord["stations"][number];

function stationOnSheet(
  db: Database,
  test: string,
  station: Station,
  { series }: Ordered,
  words: SheetWords,
): JobSheet["stations"][number] {
  const { id, instrument } = station;
  const own = words.stations[id];
  const no = series.get(id) ?? 1;
  const length = lengthOrdered(db, test, id, no) ?? plannedLength(station, no);
  return { id, instrument, place: own?.where ?? null, length, scale: own?.scale ?? scales[instrument], series: no };
}

/** What can be read at all where the plan does not say: common practice for battens and hand-held inclinometers. */
const scales: Record<Station["instrument"], [number, number]> = {
  pendulum: [-1000, 1000],
  "u-tube": [0, 2000],
  inclinometer: [-10, 10],
};

function plannedLength(station: Station, no: number): number | null {
  if (station.instrument === "inclinometer") return null;
  const series: readonly { no: number; length?: number; span?: number }[] = station.series ?? [];
  const ofSeries = series.find((one) => one.no === no);
  const length = ofSeries?.length ?? ofSeries?.span ?? (station.instrument === "pendulum" ? station.length : station.span);
  return length > 0 ? length : null;
}

// two leads who contradict each other: for a reader the move is on until they have settled it
function shownState(state: "due" | "open" | "closed" | "disagrees"): "due" | "open" | "closed" {
  return state === "disagrees" ? "open" : state;
}
