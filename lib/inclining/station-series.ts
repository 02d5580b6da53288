import { mean, standardDeviation } from "@/lib/numerics/sum";
import { answer, type Result, refuse } from "@/lib/result";
import { type Faults, gathered, inside, refuseFaults } from "./faults";
import { readingScatter, readingShown } from "./reading-shown";
import type { ReadingUncertainty } from "./reading-uncertainty";
import type { Looks } from "./readings-that-count";
import { type AngleAtZero, type TangentScale, tangentScale } from "./tangent-scale";
import type { Station } from "./test-plan";
import type { BattenReading } from "./test-readings";

/** What one station read while its batten, length and bob stayed as they were, within one session: it has one zero. */
export type StationSeries = {
  readonly id: string;
  readonly series: number;
  readonly session: number;
  readonly tangents: readonly TangentOfMove[];
};

/**
 * The tangent of one move on the station's own scale, and the standard uncertainty that its readings alone give it: as stated
 * for every reading, and by the scatter of its own marks, swings or looks, left out where there was one mark only.
 */
export type TangentOfMove = { readonly move: number; readonly tan: number; readonly uncertainty: number; readonly scatter?: number };

/** What angles lean on: the heel at zero by the marks, and the moves at which an inclinometer's zero may be read, best first. */
export type Upright = { readonly tanHeel: number; readonly zeroMoves: (session: number) => readonly number[] };

export type UnknownStation = { readonly type: "UnknownStation"; readonly station: string; readonly path: string };
export type NoZeroReading = { readonly type: "NoZeroReading"; readonly station: string; readonly series: number };

/**
 * Every station's tangents by series and session, each on its own arbitrary zero.
 *
 * Several looks in one slot count as the mean of their resting points.
 * Refused, all at once and each with its place: an unknown station, a length of zero, too few turning points,
 * a value of another instrument, an inclinometer that was not read at zero.
 */
export function stationSeries(
  stations: readonly Station[],
  battens: readonly Looks<BattenReading>[],
  upright: Upright,
  uncertainty: ReadingUncertainty,
): Result<readonly StationSeries[], Faults> {
  return gathered(slotsBySeries(battens).map((slots) => oneSeries(stations, slots, upright, uncertainty)));
}

type SeriesSlots = {
  readonly id: string;
  readonly series: number;
  readonly session: number;
  readonly slots: readonly Looks<BattenReading>[];
};
type Shown = { readonly move: number; readonly shown: number; readonly scatter: number | null; readonly looks: number };

function oneSeries(
  stations: readonly Station[],
  { slots, ...series }: SeriesSlots,
  upright: Upright,
  uncertainty: ReadingUncertainty,
): Result<StationSeries, Faults> {
  const index = stations.findIndex(({ id }) => id === series.id);
  const station = stations[index];
  if (station === undefined) return refuseFaults(slots.flatMap((looks) => looks.map(({ path }) => unknownStation(series.id, path))));
  const shown = gathered(slots.map((looks) => shownAtMove(station, looks)));
  if (!shown.ok) return shown;
  const zero = angleAtZero(station, series, shown.value, upright);
  if (!zero.ok) return inside(`stations[${index}]`, zero);
  const scale = inside(`stations[${index}]`, tangentScale(station, series.series, zero.value, uncertainty));
  return scale.ok ? answer({ ...series, tangents: shown.value.map((each) => tangentOfMove(each, scale.value)) }) : scale;
}

function shownAtMove(station: Station, looks: Looks<BattenReading>): Result<Shown, Faults> {
  const values = gathered(looks.map(({ value, path }) => inside(path, readingShown(station, value))));
  if (!values.ok) return values;
  return answer({
    move: looks[0]?.value.move ?? 0,
    shown: mean(values.value),
    scatter: scatterOfLooks(looks, values.value),
    looks: looks.length,
  });
}

// several looks tell by themselves how they scatter; one look only by its marks
function scatterOfLooks(looks: Looks<BattenReading>, shown: readonly number[]): number | null {
  const [only, ...others] = looks;
  if (others.length > 0) return standardDeviation(shown) / Math.sqrt(shown.length);
  return only ? readingScatter(only.value) : null;
}

function tangentOfMove({ move, shown, scatter, looks }: Shown, scale: TangentScale): TangentOfMove {
  const { tan, uncertainty } = scale(shown);
  const read = { move, tan, uncertainty: uncertainty / Math.sqrt(looks) };
  return scatter === null ? read : { ...read, scatter: Math.abs(scale(shown + scatter).tan - tan) };
}

function angleAtZero(
  station: Station,
  { series, session }: { readonly series: number; readonly session: number },
  shown: readonly Shown[],
  upright: Upright,
): Result<AngleAtZero, NoZeroReading> {
  if (station.instrument !== "inclinometer") return answer({ shown: 0, tanHeel: upright.tanHeel });
  const atZero = upright.zeroMoves(session).flatMap((no) => shown.filter(({ move }) => move === no));
  const zero = atZero[0];
  return zero === undefined
    ? refuse({ type: "NoZeroReading", station: station.id, series })
    : answer({ shown: zero.shown, tanHeel: upright.tanHeel });
}

function slotsBySeries(battens: readonly Looks<BattenReading>[]): readonly SeriesSlots[] {
  const groups = new Map<string, SeriesSlots>();
  for (const looks of battens) {
    for (const { value } of looks.slice(0, 1)) {
      const place = { id: value.station, series: value.series ?? 1, session: value.session ?? 1 };
      const key = JSON.stringify(place);
      groups.set(key, { ...place, slots: [...(groups.get(key)?.slots ?? []), looks] });
    }
  }
  return [...groups.values()];
}

function unknownStation(station: string, path: string): UnknownStation {
  return { type: "UnknownStation", station, path: `${path}.station` };
}
