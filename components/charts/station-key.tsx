import { StationShape } from "./station-shape";

/** Which shape is which station. */
export function StationKey({ stations, anyHollow }: { stations: readonly string[]; anyHollow: boolean }) {
  return (
    <ul className="flex flex-wrap gap-x-4 gap-y-1 text-small" aria-label="Stations in the plot">
      {stations.map((station, index) => (
        <li key={station} className="flex items-center gap-1.5">
          <Shape index={index} hollow={false} />
          Station {station}
        </li>
      ))}
      {anyHollow ? (
        <li className="flex items-center gap-1.5">
          <Shape index={0} hollow />
          Hollow: takes no part in the line
        </li>
      ) : null}
    </ul>
  );
}

function Shape({ index, hollow }: { index: number; hollow: boolean }) {
  return (
    <svg viewBox="-9 -9 18 18" className="h-4 w-4" aria-hidden="true">
      <StationShape index={index} hollow={hollow} size={6} />
    </svg>
  );
}
