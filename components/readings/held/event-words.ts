import type { BattenValue } from "@/lib/inclining/test-readings";
import { figure } from "@/lib/report/rounding";
import type { EventBody, ReadingValue } from "@/lib/sync/event";
import type { EventState } from "@/lib/sync/outbox";
import type { Receipt } from "@/lib/sync/protocol";
import { battenInWords } from "../batten/batten-in-words";
import { conditionsInWords } from "../conditions/conditions-in-words";
import { slotName } from "../due/sheet-slots";

/** Where an event stands on its way, in words. */
export function stateWords(state: EventState, receipt: Receipt | null): string {
  switch (state) {
    case "saved":
      return "Saved on this phone, not sent yet";
    case "sending":
      return "Sending now";
    case "on-server":
      return receipt?.outcome === "deferred" ? "On the server, waits for the event before it" : "On the server";
    case "confirmed":
      return "Confirmed: in a backup or the report";
    case "quarantined":
      return `Set aside by the server: ${receipt?.message ?? receipt?.code ?? "no reason given"}`;
  }
}

/** What was done, and at which place of the plan. */
export function actWords(body: EventBody): string {
  const place = body.slot ? slotName(body.slot) : body.type;
  if (body.type === "correct") return `${place}, corrected${withPhotographs(body.photographs)}`;
  if (body.type === "record") return `${place}${withPhotographs(body.photographs)}`;
  return body.type === "void" ? `${place}, taken back` : place;
}

function withPhotographs(names: readonly string[] = []): string {
  if (names.length === 0) return "";
  return names.length === 1 ? ", with a photograph" : `, with ${names.length} photographs`;
}

/** The number or words of an event; empty where it holds none. */
export function valueWords(body: EventBody): string {
  if (body.type !== "record" && body.type !== "correct") return body.reason ?? "";
  return readingWords(body.slot.kind, body.payload);
}

function readingWords(kind: string, value: ReadingValue): string {
  if ("mode" in value) return battenInWords(value as BattenValue);
  if ("density" in value) return `${figure(value.density, 4)} t/m³`;
  if ("text" in value) return value.text;
  if ("value" in value) return `${figure(value.value, 3)} m`;
  return kind === "condition" ? conditionsInWords(value) : "";
}
