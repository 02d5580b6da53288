import { execFile } from "node:child_process";
import { mkdtempSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { promisify } from "node:util";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { defendedLightship } from "@/lib/lightship/defended-lightship";
import { examined } from "@/lib/lightship/examination";
import { incliningResult } from "@/lib/lightship/inclining-result";
import { recordFrom } from "@/lib/record/parse-record";
import { resultDocument, wholeResult } from "@/lib/report/result-document";
import { promised } from "@/lib/result";
import { documentWith, sampleDocument } from "../lib/record/sample-document";

const root = path.resolve(import.meta.dirname, "../..");
let folder = "";

beforeAll(() => {
  folder = mkdtempSync(path.join(tmpdir(), "reduce-"));
});

afterAll(() => {
  rmSync(folder, { recursive: true });
});

type Ended = { readonly code: number; readonly out: string; readonly faults: readonly string[] };

async function ended(command: string, options: readonly string[]): Promise<Ended> {
  try {
    const { stdout } = await promisify(execFile)(command, options, { cwd: root });
    return { code: 0, out: stdout, faults: [] };
  } catch (error) {
    const { code, stdout, stderr } = Object(error);
    return { code, out: stdout, faults: String(stderr).trimEnd().split("\n") };
  }
}

function reduce(...options: string[]): Promise<Ended> {
  return ended(process.execPath, ["--import", "tsx", "worker/reduce.ts", ...options]);
}

function written(text: string): string {
  const file = path.join(folder, "record.json");
  writeFileSync(file, text);
  return file;
}

describe("the command reduce", () => {
  it("prints the result as JSON and nothing else", async () => {
    const document = sampleDocument();
    const { code, out, faults } = await ended("npm", ["run", "--silent", "reduce", "--", written(JSON.stringify(document))]);
    expect({ code, faults }).toEqual({ code: 0, faults: [] });
    const record = promised(recordFrom(document));
    const whole = resultDocument(
      record,
      promised(incliningResult(record)),
      promised(defendedLightship(record)),
      promised(examined(record)),
    );
    expect(JSON.parse(out)).toEqual(whole);
    expect(promised(wholeResult(record))).toEqual(whole);
  });

  it("prints it for a person with --table", async () => {
    const { code, out } = await reduce("--table", written(JSON.stringify(sampleDocument())));
    expect(code).toBe(0);
    expect(out).toMatch(/^Afloat\n {2}Draft aft +3\.\d{3} m\n/);
    expect(out).toContain("Lightship, classical method");
  });

  it("ends with 2 without a record, and with one that can't be read", async () => {
    expect(await reduce()).toEqual({ code: 2, out: "", faults: ["usage: reduce [--table] RECORD.json"] });
    const missing = path.join(folder, "missing.json");
    expect(await reduce(missing)).toEqual({ code: 2, out: "", faults: [`${missing}: no such file can be read`] });
  });

  it("ends with 2 and a line for each of several faults", async () => {
    const document = documentWith(["readings", "drafts"], []);
    Reflect.set(Object(document), "tanks", []);
    Reflect.set(Reflect.get(Object(document), "readings"), "soundings", []);
    Reflect.set(Reflect.get(Object(document), "readings"), "water", []);
    expect(await reduce(written(JSON.stringify(document)))).toEqual({
      code: 2,
      out: "",
      faults: [
        "readings.drafts: a waterline needs at least 3 marks that count, 0 read",
        "readings.water: no sample of the water's density counts, at least 1 needed",
      ],
    });
  });
});

describe("a malformed record ends with 2, its place and no result:", () => {
  const { battens } = sampleDocument().readings;

  it.each<[string, (string | number)[], unknown, string]>([
    ["another format", ["format"], "other", 'format: "battenbook-record" needed, "other" given'],
    ["another version", ["version"], 2, "version: 1 needed, 2 given"],
    ["an unknown key", ["vessel", "colour"], "red", 'vessel.colour: unknown key "colour"'],
    ["no stations", ["stations"], undefined, "stations: an array needed, nothing given"],
    ["a text for a number", ["vessel", "lbp"], "54", 'vessel.lbp: a number needed, "54" given'],
    ["a null for a reading", ["readings", "drafts", 0, "value"], null, "readings.drafts[0].value: a number needed, null given"],
    ["a negative mass", ["weights", 1, "mass"], -4, "weights[1].mass: a number above 0 needed, -4 given"],
    [
      "a place of two numbers",
      ["moves", 1, "positions", "W1"],
      [1, 2],
      "moves[1].positions.W1: at least 3 entries needed, 2 entries given",
    ],
    [
      "an unknown instrument",
      ["stations", 0, "instrument"],
      "clock",
      'stations[0].instrument: "pendulum" or "u-tube" or "inclinometer" needed, "clock" given',
    ],
    ["a pendulum without length", ["stations", 0, "length"], 0, "stations[0].length: a length above 0 needed, 0 given"],
    [
      "two turning points",
      ["readings", "battens", 0, "valuesMm"],
      [101, 97],
      "readings.battens[0].valuesMm: at least 3 turning points, 2 given",
    ],
    ["an unknown station", ["readings", "battens", 5, "station"], "Z", "readings.battens[5].station: station Z is not in the plan"],
    ["an unknown move", ["readings", "battens", 5, "move"], 44, "readings.battens[5].move: move 44 is not in the plan"],
    ["an unknown mark", ["readings", "drafts", 2, "mark"], "ZZ", "readings.drafts[2].mark: mark ZZ is not in the plan"],
    ["a lost weight", ["moves", 2, "positions", "W3"], undefined, "moves[2].positions: move 2 lacks the position of weight W3"],
    ["no move 0", ["moves", 0, "no"], 20, "moves: no move 0, from which all moments count"],
    ["a station twice", ["stations", 1, "id"], "A", "stations[1].id: A is given twice, first in stations[0].id"],
    [
      "a tank sounded beyond its table",
      ["readings", "soundings", 0, "value"],
      9,
      "readings.soundings[0].value: the level of 9 m lies outside the table of tank FW-P, which runs from 0 m to 2.4 m",
    ],
    ["a tank not sounded", ["readings", "soundings"], [], "tanks[0]: tank FW-P has no sounding that counts"],
    [
      "a section with a negative half-breadth",
      ["hydrostatics", "sections", 3, "points", 1, 0],
      -1,
      "hydrostatics.sections[3].points[1][0]: a number at least 0 needed, -1 given",
    ],
    ["one section twice", ["hydrostatics", "sections", 3, "x"], 2, "hydrostatics: two sections stand at x = 2 m"],
    ["two moves read", ["readings", "battens"], battens.filter(({ move }) => move < 2), "record: at least 3 moves that were read, 2 given"],
  ])("%s", async (_, place, value, line) => {
    const { code, out, faults } = await reduce(written(JSON.stringify(documentWith(place, value))));
    expect({ code, out }).toEqual({ code: 2, out: "" });
    expect(faults).toContain(line);
  });

  it("a NaN", async () => {
    const text = JSON.stringify(sampleDocument()).replace(/"valuesMm":\[[^,]+,/, '"valuesMm":[NaN,');
    const { code, out, faults } = await reduce(written(text));
    expect({ code, out, faults }).toEqual({ code: 2, out: "", faults: ["readings.battens[0].valuesMm[0]: a number needed, NaN given"] });
  });

  it("no JSON at all", async () => {
    const { code, out, faults } = await reduce(written("{"));
    expect({ code, out }).toEqual({ code: 2, out: "" });
    expect(faults[0]).toMatch(/^record: not a JSON document: /);
  });
});
