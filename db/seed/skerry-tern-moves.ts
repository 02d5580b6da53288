import type { TestRecord } from "@/lib/record/test-record";

type Place = [number, number, number];

/** Four blocks of concrete on the main deck, W1 and W2 to port, W3 and W4 to starboard at the start. */
export const skerryTernWeights: TestRecord["weights"] = [
  { id: "W1", mass: 4.212, certificate: "weighed on the crane scale, April 2026" },
  { id: "W2", mass: 4.186, certificate: "weighed on the crane scale, April 2026" },
  { id: "W3", mass: 4.204, certificate: "weighed on the crane scale, April 2026" },
  { id: "W4", mass: 4.195, certificate: "weighed on the crane scale, April 2026" },
];

/**
 * Eight moves there and back, to starboard first: W1, W2 across and back, then W3, W4 across to port and back.
 * Move 0 is the zero before them. Source: the pattern of eight movements, IMO 2008 IS Code, part B annex 1 *from memory*.
 */
export function skerryTernMoves(): TestRecord["moves"] {
  return across.map((crossed, no) => ({
    no,
    positions: Object.fromEntries(
      Object.entries(places).map(([id, { port, starboard, startsAt }]) => {
        const isPort = (startsAt === "port") !== crossed.includes(id);
        return [id, isPort ? port : starboard];
      }),
    ),
  }));
}

/** The weights that stand on the other side than at the start, move by move. */
const across: readonly (readonly string[])[] = [[], ["W1"], ["W1", "W2"], ["W1"], [], ["W3"], ["W3", "W4"], ["W4"], []];

/** As measured to the weights' centres; the deck rises forward, so W2 and W4 stand a little higher. */
const places: Readonly<Record<string, { port: Place; starboard: Place; startsAt: "port" | "starboard" }>> = {
  W1: { port: [18.02, -4.05, 5.91], starboard: [18.02, 3.96, 5.91], startsAt: "port" },
  W2: { port: [29.01, -4.02, 5.93], starboard: [29.01, 4.01, 5.93], startsAt: "port" },
  W3: { port: [16.01, -3.98, 5.91], starboard: [16.01, 4.03, 5.91], startsAt: "starboard" },
  W4: { port: [31.02, -3.99, 5.93], starboard: [31.02, 4.02, 5.93], startsAt: "starboard" },
};
