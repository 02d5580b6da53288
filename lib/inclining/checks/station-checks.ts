import { mean } from "@/lib/numerics/sum";
import type { MomentTangentLine } from "../inclined-ship";
import { stationAgreement, zeroDrift } from "../line-diagnostics";
import type { IncliningTestData } from "../test-data";
import type { CheckLimits } from "./check-limits";
import { type Finding, metOrAttention } from "./finding";

/** How many stations were read; on a small ship class may accept one less than the least. */
export function stationCount({ vessel }: IncliningTestData, { stations }: MomentTangentLine, limits: CheckLimits): Finding {
  const { recommended, least } = limits.stations;
  const read = new Set(stations.map(({ id }) => id)).size;
  const isAccepted = read >= least || (read === least - 1 && vessel.lbp < limits.smallShip);
  const verdict = read >= recommended ? "met" : isAccepted ? "attention" : "not-met";
  return { id: "stations", verdict, found: { stations: read }, limit: { recommended, least, smallShip: limits.smallShip } };
}

/** Whether the pendulums differ in length, so that they do not swing in step. Nothing with fewer than two. */
export function unequalLengths({ stations }: IncliningTestData, { equalLengths: share }: CheckLimits): readonly Finding[] {
  const lengths = stations.flatMap((station) => (station.instrument === "pendulum" ? [station.length] : [])).sort((a, b) => a - b);
  if (lengths.length < 2) return [];
  const isUnequal = lengths.slice(1).every((length, i) => length - (lengths[i] ?? 0) > share * length);
  return [{ id: "unequal-lengths", verdict: metOrAttention(isUnequal), found: { lengths }, limit: { share } }];
}

/** How far the station that differs most has a slope of its own. Nothing while stations have no lines of their own. */
export function agreementOfStations(line: MomentTangentLine, { stationSlope: share }: CheckLimits): readonly Finding[] {
  const [farthest, ...others] = stationAgreement(line).toSorted((a, b) => Math.abs(b.slopeDeviation) - Math.abs(a.slopeDeviation));
  if (farthest === undefined || others.length === 0) return [];
  const { id: station, slopeDeviation: deviation } = farthest;
  return [
    {
      id: "station-agreement",
      verdict: metOrAttention(Math.abs(deviation) <= share),
      found: { station, deviation },
      limit: { share },
    },
  ];
}

/** Stations whose bob goes against the others: mounted the other way, or read the other way. */
export function senseOfStations(line: MomentTangentLine): readonly Finding[] {
  const stations = stationAgreement(line);
  if (stations.length === 0) return [];
  const against = [...new Set(stations.filter(({ hasSense }) => !hasSense).map(({ id }) => id))];
  return [{ id: "station-sense", verdict: against.length === 0 ? "met" : "not-met", found: { against }, limit: null }];
}

/** The last zero against the first, mean over the stations of one session; the session that drifted most [tangent]. */
export function driftOfZero(line: MomentTangentLine, { zeroDrift: share }: CheckLimits): Finding {
  const heel = Math.max(0, ...line.moves.map(({ tanHeel }) => Math.abs(tanHeel)));
  const drifts = zeroDrift(line);
  const bySession = [...new Set(drifts.map(({ session }) => session))].map((session) =>
    mean(drifts.filter((each) => each.session === session).map(({ drift }) => drift)),
  );
  const [drift = null] = bySession.sort((a, b) => Math.abs(b) - Math.abs(a));
  const isMet = drift !== null && Math.abs(drift) <= share * heel;
  return { id: "zero-drift", verdict: metOrAttention(isMet), found: { drift, heel }, limit: { share } };
}
