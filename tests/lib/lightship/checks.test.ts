import { describe, expect, it } from "vitest";
import { usualLimits } from "@/lib/inclining/checks/check-limits";
import { incliningTest } from "@/lib/inclining/inclining-test";
import { checksOf } from "@/lib/lightship/checks";
import { lightshipBalance, lightshipOf } from "@/lib/lightship/lightship";
import type { TestRecord } from "@/lib/record/test-record";
import { promised } from "@/lib/result";
import { sampleDocument } from "../record/sample-document";
import { mirrored } from "./changed-records";

function checked(record: TestRecord, limits = usualLimits) {
  const ship = promised(incliningTest(record));
  return checksOf(record, ship, lightshipOf(promised(lightshipBalance(ship, record))), limits);
}

describe("the checks of a test", () => {
  const record = sampleDocument();
  const findings = checked(record);

  it("stand once each, every number of them finite", () => {
    const ids = findings.map(({ id }) => id);
    expect(new Set(ids).size).toBe(ids.length);
    expect(ids.length).toBeGreaterThan(18);
    const numbers = JSON.stringify(findings, (_, value) => (typeof value === "number" && !Number.isFinite(value) ? "lost" : value));
    expect(numbers).not.toContain("lost");
  });

  it("compare with another ship only where the test names one", () => {
    expect(findings.some(({ id }) => id === "previous-vcg")).toBe(record.previous !== undefined);
    const previous = { kind: "sister" as const, displacement: 2000, vcg: 4, lcg: 20 };
    const compared = checked({ ...record, previous }).filter(({ id }) => id.startsWith("previous-"));
    expect(compared.map(({ verdict }) => verdict)).toEqual(["not-met", "not-met", "not-met"]);
  });

  it("give a ship seen in a mirror the same verdicts", () => {
    expect(checked(mirrored(record)).map(({ id, verdict }) => [id, verdict])).toEqual(findings.map(({ id, verdict }) => [id, verdict]));
  });

  it("hold against limits that the caller sets", () => {
    const strict = checked(record, { ...usualLimits, heel: [30, 40] });
    expect(strict.find(({ id }) => id === "heel-range")).toMatchObject({ verdict: "not-met", limit: { least: 30, most: 40 } });
  });

  it("report a station mounted the other way and still stand", () => {
    const [first] = record.stations;
    const stations = record.stations.map((station) => (station === first ? { ...station, reversed: station.reversed !== true } : station));
    const sense = checked({ ...record, stations }).find(({ id }) => id === "station-sense");
    expect(sense).toMatchObject({ verdict: "not-met", found: { against: [first?.id] } });
  });
});
