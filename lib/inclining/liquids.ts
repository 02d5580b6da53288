import type { TankBox } from "@/lib/hydrostatics/box-liquid";
import { type Attitude, type TankContents, tankContents } from "@/lib/hydrostatics/tank";
import { answer, type Result, refuse } from "@/lib/result";
import { type Faults, gathered, inside } from "./faults";
import type { CountedReadings, Looks } from "./readings-that-count";
import type { IncliningTestData } from "./test-data";
import type { SoundingReading } from "./test-readings";

/** What stands in one tank at the reference state, and the density of it [t/m³]. */
export type Liquid = TankContents & { readonly id: string; readonly density: number; readonly box?: TankBox };

export type NoSounding = { readonly type: "NoSounding"; readonly tank: string };
export type NoBallastSounding = { readonly type: "NoBallastSounding"; readonly tank: string; readonly move: number };

/**
 * The liquids aboard at the reference state: each tank as sounded, with the ship lying as the marks say.
 *
 * Refused, all at once: a tank without a sounding that counts; what a tank's table refuses, with the reading's place.
 */
export function liquidsAboard(test: IncliningTestData, counted: CountedReadings, attitude: Attitude): Result<readonly Liquid[], Faults> {
  return gathered(test.tanks.map((tank, i) => liquidIn(test, i, atReference(counted, tank.id), attitude)));
}

/** What stands in a tank of shifting ballast at one move; at move 0 its sounding of the round serves where none was taken with the move. */
export function ballastAtMove(
  test: IncliningTestData,
  counted: CountedReadings,
  tank: number,
  { no }: { readonly no: number },
  attitude: Attitude,
): Result<Liquid, Faults> {
  const id = test.tanks[tank]?.id ?? "";
  const looks = soundedAt(counted, id, no) ?? (no === 0 ? atReference(counted, id) : undefined);
  if (looks !== undefined) return liquidIn(test, tank, looks, attitude);
  return inside(`tanks[${tank}]`, refuse({ type: "NoBallastSounding", tank: id, move: no } satisfies NoBallastSounding));
}

function liquidIn(
  { tanks }: IncliningTestData,
  index: number,
  looks: Looks<SoundingReading> | undefined,
  attitude: Attitude,
): Result<Liquid, Faults> {
  const tank = tanks[index];
  const first = looks?.[0];
  if (tank === undefined || looks === undefined || first === undefined) {
    return inside(`tanks[${index}]`, refuse({ type: "NoSounding", tank: tank?.id ?? "" } satisfies NoSounding));
  }
  const contents = tankContents(tank, meanLevel(looks), attitude);
  if (!contents.ok) return inside(`${first.path}.value`, contents);
  const { id, density, box } = tank;
  // ballast that shifts is sounded at each move: its centre is known there, and counts with the moments
  return answer({ ...contents.value, id, density, ...(box && !tank.shifts ? { box } : {}) });
}

function meanLevel(looks: Looks<SoundingReading>): number {
  return looks.reduce((total, { value }) => total + value.value, 0) / looks.length;
}

function atReference(counted: CountedReadings, tank: string): Looks<SoundingReading> | undefined {
  return counted.soundings.find(([look]) => look?.value.tank === tank) ?? soundedAt(counted, tank, 0);
}

function soundedAt({ ballast }: CountedReadings, tank: string, move: number): Looks<SoundingReading> | undefined {
  return ballast.find(([look]) => look?.value.tank === tank && look.value.move === move);
}
