import type { Phone } from "@/lib/sync/live";
import { runsInWords } from "./runs-in-words";

/** What a phone has taken and what has arrived: "41 taken, 39 received, missing 12–13". */
export function phoneInWords(phone: Phone): string {
  if (phone.highestSeq === 0) return "Nothing taken yet";
  const missing = phone.missing.length > 0 ? `, missing ${runsInWords(phone.missing)}` : "";
  return `${phone.highestSeq} taken, ${phone.received} received${missing}`;
}

export function heardInWords(lastHeardAt: string | null, now: number): string {
  if (lastHeardAt === null) return "Not heard yet";
  const minutes = Math.floor(Math.max(0, now - Date.parse(lastHeardAt)) / 60_000);
  if (minutes < 1) return "Heard just now";
  if (minutes < 60) return `Heard ${minutes} min ago`;
  const hours = Math.floor(minutes / 60);
  if (hours < 24) return `Heard ${hours} h ${minutes % 60} min ago`;
  const days = Math.floor(hours / 24);
  return `Heard ${days} ${days === 1 ? "day" : "days"} ago`;
}
