import type { QueueCount } from "./outbox";

/** Whether the queue can move: the server answered, nothing answered, or it wants to know who is sending. */
export type Reach = "unknown" | "reached" | "no-answer" | "sign-in-needed";

/** The state of the queue as a person reads it, always on screen. */
export function queueWords(count: QueueCount, reach: Reach): string {
  if (reach === "sign-in-needed" && count.unsent > 0) return `${saved(count.unsent)}: sign in to send. Readings go on`;
  const aside = count.quarantined > 0 ? `; ${count.quarantined} set aside by the server` : "";
  if (count.unsent > 0) return `${saved(count.unsent)}, not sent yet${aside}`;
  if (count.onServer + count.quarantined === 0) return "Nothing saved on this phone yet";
  return `All ${count.onServer + count.quarantined} on the server${backedUp(count)}${aside}`;
}

/** "2 photographs still on this phone"; nothing where none is owed. */
export function photographsOwedInWords(count: number): string {
  if (count === 0) return "";
  return `${count} ${count === 1 ? "photograph" : "photographs"} still on this phone`;
}

function backedUp({ onServer, confirmed }: QueueCount): string {
  if (confirmed === 0) return "";
  return confirmed === onServer ? ", backed up" : `, ${confirmed} backed up`;
}

function saved(count: number): string {
  return `${count} saved on this phone`;
}
