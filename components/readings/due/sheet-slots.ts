import type { JobSheet } from "@/lib/sync/job-sheet";
import type { Slot } from "@/lib/sync/slot";
import type { Task } from "../task/cautions";

/** The readings due by one sheet, task by task, in the order in which the day goes. */
export function sheetSlots(sheet: JobSheet, task: Task): Slot[] {
  switch (task) {
    case "batten":
      return sheet.moves.flatMap(({ no, repeat }) =>
        sheet.stations.map(({ id, series }): Slot => ({ kind: "batten", move: no, repeat, station: id, series })),
      );
    case "draft":
      return sheet.rounds.flatMap((round) => [
        ...sheet.draftMarks.map(({ id }): Slot => ({ kind: "draft", mark: id, round })),
        ...sheet.freeboardMarks.map(({ id }): Slot => ({ kind: "freeboard", mark: id, round })),
      ]);
    case "sounding":
      return [
        ...sheet.rounds.flatMap((round) => sheet.tanks.map(({ id }): Slot => ({ kind: "sounding", tank: id, round }))),
        ...sheet.moves.flatMap(({ no }) =>
          sheet.tanks.filter(({ shifts }) => shifts).map(({ id }): Slot => ({ kind: "ballast", tank: id, move: no })),
        ),
      ];
    case "water":
      return sheet.rounds.flatMap((round) => sheet.water.map(({ place, depth }): Slot => ({ kind: "water", place, depth, round })));
    case "conditions":
      return sheet.moves.map(({ no }): Slot => ({ kind: "condition", move: no }));
  }
}

/** What a slot is called within its task: short enough for a key. */
export function slotName(slot: Slot): string {
  switch (slot.kind) {
    case "batten":
      return `Station ${slot.station}, move ${slot.move}${slot.repeat > 1 ? `, repeat ${slot.repeat}` : ""}`;
    case "draft":
    case "freeboard":
      return slot.mark;
    case "sounding":
      return slot.tank;
    case "ballast":
      return `${slot.tank}, move ${slot.move}`;
    case "water":
      return `${slot.place}, ${slot.depth} m`;
    case "position":
      return `${slot.weight}, move ${slot.move}`;
    case "length":
      return `Station ${slot.station}`;
    case "condition":
      return `Move ${slot.move}`;
    case "note":
      return "Note";
  }
}

/** The round or stretch of the day a slot belongs to: the heading under which it is listed. */
export function slotGroup(slot: Slot): string {
  if ("round" in slot) return slot.round === "before" ? "Before the moves" : "After the moves";
  return slot.kind === "note" ? "Any time" : "During the moves";
}
