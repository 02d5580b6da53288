import { skerryTernReadings } from "@/db/seed/skerry-tern";
import { type RecordedReading, recordedReadings } from "@/lib/sync/recorded-reading";

export type Taken = Pick<RecordedReading, "slot" | "value">;

const stations = ["A", "B", "C", "U"] as const;
const crew = recordedReadings(skerryTernReadings(7));

/** The first reading of the demo's simulated crew that is as asked. */
export function crewRead(isIt: (slot: RecordedReading["slot"]) => boolean): RecordedReading {
  const found = crew.find(({ slot }) => isIt(slot));
  if (!found) throw new Error("the simulated crew has no such reading");
  return found;
}

export function sounding(tank: string): RecordedReading {
  return crewRead((slot) => slot.kind === "sounding" && slot.tank === tank && slot.round === "before");
}

export function batten(move: number, station: string): RecordedReading {
  return crewRead((slot) => slot.kind === "batten" && slot.move === move && slot.station === station);
}

export function battensOf(move: number): RecordedReading[] {
  return stations.map((station) => batten(move, station));
}
