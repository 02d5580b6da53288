import { performance } from "node:perf_hooks";
import { perfectReadings } from "@/db/seed/simulated-readings";
import { skerryTern, skerryTernReadings } from "@/db/seed/skerry-tern";
import { hullFromOffsets } from "@/lib/hydrostatics/hull";
import { hydrostaticsAt } from "@/lib/hydrostatics/hydrostatics-at";
import { incliningResult } from "@/lib/lightship/inclining-result";
import { uncertainLightship } from "@/lib/lightship/lightship-interval";
import { seededNoise } from "@/lib/numerics/seeded-noise";
import { promised } from "@/lib/result";
import { modelOf } from "@/lib/uncertainty/local-expansion";
import { drawnAtOnce } from "@/lib/uncertainty/monte-carlo";
import { answerToControl } from "./live-bench";
import { reconnecting } from "./reconnect-bench";
import { solidHull } from "./solid-hull";
import { syncAgainstInserts } from "./sync-bench";
import { tapToSaved } from "./tap-bench";

/** Times side by side in one run, as ratios: machines are noisy. `npm run bench`. */
const { record } = skerryTern();
const tern = { ...record, readings: skerryTernReadings(7, perfectReadings) };

await hydrostatics();
reduction();
draws();
await syncAgainstInserts();
await answerToControl();
await reconnecting();
await tapToSaved();

/** One waterplane: everything of hydrostatics by ours, the volume alone by the solid. */
async function hydrostatics(): Promise<void> {
  if (record.hydrostatics.kind !== "offsets") return;
  const { sections } = record.hydrostatics;
  const hull = promised(hullFromOffsets({ sections }));
  const solid = await solidHull({ sections });
  const plane = { draftAtAp: 3.4, slopeAlong: -0.008, tanHeel: 0.03, sag: 0, lbp: record.vessel.lbp };
  const ours = timed(300, () => promised(hydrostaticsAt(hull, plane)).volume);
  const theirs = timed(300, () => solid.volumeBelow(plane));
  console.log("Hydrostatics at one waterplane (trim 0.43 m, heel 1.7°)");
  line("ours: volume, centres, waterplane, second moments", ours);
  line("solid of triangles cut by a plane: volume alone", theirs);
  console.log(`  ratio ${(theirs.each / ours.each).toFixed(2)}; volumes differ by ${(100 * (theirs.value / ours.value - 1)).toFixed(4)} %`);
}

function reduction(): void {
  const afresh = () => ({ ...tern, hydrostatics: { ...tern.hydrostatics } });
  const known = timed(60, () => promised(incliningResult(tern)).lightship.vcg);
  const fresh = timed(20, () => promised(incliningResult(afresh())).lightship.vcg);
  console.log("The whole reduction, both methods");
  line("a hull seen before", known);
  line("a hull seen for the first time", fresh);
}

function draws(): void {
  const count = 100_000;
  const { expansion, inputs } = promised(uncertainLightship(tern));
  const drawn = timed(3, () => drawnAtOnce(modelOf(expansion), inputs, count, seededNoise(1))[0]?.[0] ?? 0);
  const numbers = timed(3, () => onlyNumbers(count * inputs.length));
  console.log(`Monte Carlo, ${count} draws of ${inputs.length} inputs`);
  line("drawn", drawn);
  line("a loop that only draws the random numbers", numbers);
  console.log(`  ratio ${(drawn.each / numbers.each).toFixed(2)}; ${Math.round((1000 * count) / drawn.each)} draws a second`);
}

function onlyNumbers(count: number): number {
  const noise = seededNoise(1);
  let total = 0;
  for (let i = 0; i < count; i++) total += noise.normal(1);
  return total;
}

type Timed = { readonly each: number; readonly value: number };

function timed(times: number, work: () => number): Timed {
  let value = work();
  const start = performance.now();
  for (let i = 0; i < times; i++) value = work();
  return { each: (performance.now() - start) / times, value };
}

function line(name: string, { each }: Timed): void {
  console.log(`  ${name.padEnd(52)} ${each.toFixed(3).padStart(10)} ms`);
}
