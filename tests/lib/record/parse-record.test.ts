import { describe, expect, it } from "vitest";
import { faultsOf } from "@/lib/inclining/faults";
import { parseRecord, recordFrom } from "@/lib/record/parse-record";
import { refusalLine } from "@/lib/report/refusal-sentence";
import { documentWith, sampleDocument } from "./sample-document";

const linesOf = (document: unknown) => faultsOf(recordFrom(document)).map(refusalLine);

describe("a record", () => {
  it("comes back from its text as it was", () => {
    const document = sampleDocument();
    expect(parseRecord(JSON.stringify(document))).toEqual({ ok: true, value: document });
  });

  it("that is no JSON is refused as a whole", () => {
    expect(faultsOf(parseRecord("not a record"))).toMatchObject([{ type: "NotJson", path: "record" }]);
    expect(linesOf(null)).toEqual(["record: an object needed, null given"]);
  });

  it("names the place of a NaN", () => {
    const text = JSON.stringify(sampleDocument()).replace(/"valuesMm":\[[^,]+,/, '"valuesMm":[NaN,');
    expect(faultsOf(parseRecord(text)).map(refusalLine)).toEqual(["readings.battens[0].valuesMm[0]: a number needed, NaN given"]);
  });

  it("with several faults has them all named", () => {
    const document = documentWith(["vessel", "breadth"], 0);
    Reflect.set(Object(document), "version", 2);
    expect(linesOf(document)).toEqual(["version: 1 needed, 2 given", "vessel.breadth: a number above 0 needed, 0 given"]);
  });

  it("of another format or version is refused", () => {
    expect(linesOf(documentWith(["format"], "other"))).toEqual(['format: "battenbook-record" needed, "other" given']);
  });

  it("keeps readings that take no part as they came, unknown places and all", () => {
    const document = sampleDocument();
    const [first] = document.readings.battens;
    const stray = { ...first, status: "quarantined", station: "Z", move: 99, valuesMm: [1] };
    const battens = [...document.readings.battens, stray];
    expect(recordFrom({ ...document, readings: { ...document.readings, battens } }).ok).toBe(true);
  });
});

describe("what refers to what", () => {
  const { battens, soundings } = sampleDocument().readings;
  const [first] = battens;
  const unknown = "00000000-0000-4000-8000-00000000aaaa";

  it.each<[string, (string | number)[], unknown, string]>([
    ["an unknown station", ["readings", "battens", 5, "station"], "Z", "readings.battens[5].station: station Z is not in the plan"],
    ["an unknown move", ["readings", "battens", 5, "move"], 44, "readings.battens[5].move: move 44 is not in the plan"],
    ["an unknown series", ["readings", "battens", 5, "series"], 2, "readings.battens[5].series: series 2 is not in the plan"],
    ["an unknown mark", ["readings", "drafts", 2, "mark"], "ZZ", "readings.drafts[2].mark: mark ZZ is not in the plan"],
    ["an unknown tank", ["readings", "soundings", 0, "tank"], "ZZ", "readings.soundings[0].tank: tank ZZ is not in the plan"],
    [
      "an unknown hydrometer",
      ["readings", "water", 1, "hydrometer"],
      "H9",
      "readings.water[1].hydrometer: hydrometer H9 is not in the plan",
    ],
    ["an unknown weight", ["moves", 2, "positions", "W9"], [1, 2, 3], "moves[2].positions.W9: weight W9 is not in the plan"],
    [
      "a move without a weight's place",
      ["moves", 2, "positions", "W3"],
      undefined,
      "moves[2].positions: move 2 lacks the position of weight W3",
    ],
    ["no move 0", ["moves", 0, "no"], 20, "moves: no move 0, from which all moments count"],
    ["a move given twice", ["moves", 2, "no"], 1, "moves[2].no: move 1 is given twice, first in moves[1].no"],
    ["a station given twice", ["stations", 1, "id"], "A", "stations[1].id: A is given twice, first in stations[0].id"],
    ["a mark given twice", ["draftMarks", 1, "id"], "AP", "draftMarks[1].id: AP is given twice, first in draftMarks[0].id"],
    ["a weight given twice", ["weights", 1, "id"], "W1", "weights[1].id: W1 is given twice, first in weights[0].id"],
    ["a tank given twice", ["tanks", 1, "id"], "FW-P", "tanks[1].id: FW-P is given twice, first in tanks[0].id"],
    [
      "a reading given twice",
      ["readings", "battens", 1, "id"],
      first?.id,
      `readings.battens[1].id: ${first?.id} is given twice, first in readings.battens[0].id`,
    ],
    [
      "two turning points",
      ["readings", "battens", 0, "valuesMm"],
      [101, 97],
      "readings.battens[0].valuesMm: at least 3 turning points, 2 given",
    ],
    [
      "a pendulum's value at a U-tube",
      ["readings", "battens", 3],
      { ...first, id: unknown, station: "U" },
      "readings.battens[3].valuesMm: a reading of a u-tube needs portMm and starboardMm",
    ],
    [
      "a sounding of no round",
      ["readings", "soundings", 0, "round"],
      undefined,
      "readings.soundings[0]: a sounding needs a round or a move, neither given",
    ],
    [
      "a sounding of a round and a move",
      ["readings", "soundings", 0, "move"],
      1,
      "readings.soundings[0]: a sounding needs a round or a move, both given",
    ],
    [
      "a sounding at a move of a tank that does not shift",
      ["readings", "soundings", 0],
      { ...soundings[0], round: undefined, move: 1 },
      "readings.soundings[0].move: tank FW-P was sounded at a move but is not ballast that shifts",
    ],
  ])("names %s with its place", (_, path, value, line) => {
    expect(linesOf(documentWith(path, value))).toContain(line);
  });
});
