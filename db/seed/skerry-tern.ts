import { seededNoise } from "@/lib/numerics/seeded-noise";
import type { TestRecord } from "@/lib/record/test-record";
import { promised } from "@/lib/result";
import { carefulReadings, type ReadingQuality, simulatedReadings } from "./simulated-readings";
import { type SimulatedTruth, simulatedShip } from "./simulated-ship";
import { skerryTernSections } from "./skerry-tern-hull";
import { skerryTernLoads, skerryTernTanks } from "./skerry-tern-loads";
import { skerryTernMoves, skerryTernWeights } from "./skerry-tern-moves";

/** The plan of the demo's test without a reading in it, and what is true of the ship. Everything is invented. */
export function skerryTern(): { readonly record: TestRecord; readonly truth: SimulatedTruth } {
  return { record: plan(), truth };
}

/** What a crew reads on her: the same for the same seed, and carefully unless said otherwise. */
export function skerryTernReadings(seed: number, quality: ReadingQuality = carefulReadings): TestRecord["readings"] {
  const ship = promised(simulatedShip(plan(), truth));
  return promised(simulatedReadings(ship, quality, seededNoise(seed)));
}

const truth: SimulatedTruth = {
  lightship: { displacement: 1318.4, lcg: 24.86, tcg: -0.021, vcg: 5.713 },
  waterDensity: 1.0214,
  levels: { "FW-P": 2.4, "FW-S": 2.4, "FO-P": 0.52, "FO-S": 0.48, "FO-D": 2, LO: 0.8, "BW-F": 0, "BW-C": 1, GW: 0 },
};

function plan(): TestRecord {
  return {
    format: "battenbook-record",
    version: 1,
    test: {
      id: "5ce44715-0000-4000-8000-000000000001",
      title: "Inclining test after conversion",
      date: "2026-05-04",
      place: "Fitting-out quay of an invented yard",
    },
    vessel: { name: "MV Skerry Tern", hullNumber: "117", lbp: 54, breadth: 12.4, depth: 5.4 },
    hydrostatics: { kind: "offsets", sections: skerryTernSections(), shellFactor: 1.006, appendages },
    draftMarks,
    stations,
    weights: skerryTernWeights,
    moves: skerryTernMoves(),
    tanks: skerryTernTanks(),
    ...skerryTernLoads,
    hydrometers: [{ id: "H1", scale: "density-vacuum", correction: 0, certificate: "calibrated in March 2026" }],
    previous: { kind: "earlier", displacement: 1296.2, vcg: 5.688, lcg: 24.97 },
    readings: { battens: [], drafts: [], soundings: [], water: [] },
    settings: { method: "classical", seed: 1, expected: { displacement: 1480, lcg: 24.2, tcg: 0, vcg: 5.4, density: 1.02 } },
    uncertainty,
  };
}

const appendages = [
  { label: "rudder", volume: 0.9, x: -0.4, y: 0, z: 1.6 },
  { label: "bilge keels", volume: 0.7, x: 24, y: 0, z: 0.6 },
  { label: "bow thruster tunnel", volume: -2.4, x: 47, y: 0, z: 1.5 },
];

/** On the side, where the hull stands at the waterline; zeros at the underside of the keel plate. */
const draftMarks = [
  { id: "AP", x: 2, y: -5.4, zero: -0.012 },
  { id: "AS", x: 2, y: 5.4, zero: -0.012 },
  { id: "MP", x: 27, y: -6.2, zero: -0.012 },
  { id: "MS", x: 27, y: 6.2, zero: -0.012 },
  { id: "FP", x: 50, y: -2.3, zero: -0.012 },
  { id: "FS", x: 50, y: 2.3, zero: -0.012 },
];

const stations: TestRecord["stations"] = [
  { id: "A", instrument: "pendulum", length: 4.1, x: 12 },
  { id: "B", instrument: "pendulum", length: 4.65, x: 26 },
  { id: "C", instrument: "pendulum", length: 3.8, x: 41 },
  { id: "U", instrument: "u-tube", span: 9.6, x: 20 },
];

const uncertainty = {
  weightRelative: 0.001,
  distance: 0.005,
  length: 0.002,
  readingMm: 0.5,
  draft: 0.002,
  density: 0.0002,
  itemMassRelative: 0.05,
  itemPosition: 0.1,
  sounding: 0.005,
};
