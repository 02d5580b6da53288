import { seriesName } from "@/components/control/line-so-far";
import { Cell, ColumnHead, DataTable, RowHead } from "@/components/ui/data-table";
import { Panel } from "@/components/ui/panel";
import { Quantity } from "@/components/ui/quantity";
import type { MomentTangentLine } from "@/lib/inclining/inclined-ship";
import type { InclinedShip } from "@/lib/inclining/inclining-test";
import type { IncliningTestData } from "@/lib/inclining/test-data";
import { MovesTable } from "./moves-table";

const PER_METRE = 1000;

/** The common slope with its interval, and what each station says by itself. */
export function FitPanel({ test, ship, gmDecimals }: { test: IncliningTestData; ship: InclinedShip; gmDecimals: number }) {
  const { line } = ship;
  const { spread } = line;
  return (
    <Panel title="The line" aside={`tangent on moment, least squares, ${howWeighed(test)}, one intercept for each station`}>
      <p>
        Common slope{" "}
        <strong>
          <Quantity
            value={line.slope * PER_METRE}
            unit="mm per m for each t·m"
            uncertainty={spread ? spread.slopeUncertainty * PER_METRE : line.slope}
          />
        </strong>
        {spread ? (
          <>
            , known to ±
            <Quantity value={spread.halfWidth95 * 100} unit="%" decimals={2} /> with 95 % confidence, {spread.degreesOfFreedom} degrees of
            freedom from {line.moves.length} moves.
          </>
        ) : (
          ". Fewer than three moves: its uncertainty can’t be told."
        )}
      </p>
      <div className="mt-3">
        <OwnSlopes line={line} />
      </div>
      <div className="mt-4">
        <MovesTable test={test} ship={ship} gmDecimals={gmDecimals} />
      </div>
    </Panel>
  );
}

function howWeighed({ settings }: IncliningTestData): string {
  return settings?.weights === "readings" ? "each reading by how well it is known" : "all readings alike";
}

function OwnSlopes({ line: { stations, slope, spread } }: { line: MomentTangentLine }) {
  return (
    <DataTable caption="Slope of each station by itself" showCaption>
      <thead>
        <tr>
          <ColumnHead>Station</ColumnHead>
          <ColumnHead figure>Own slope, mm per m for each t·m</ColumnHead>
          <ColumnHead figure>Largest residual</ColumnHead>
        </tr>
      </thead>
      <tbody>
        {stations.map((station) => (
          <tr key={seriesName(station)}>
            <RowHead>{seriesName(station)}</RowHead>
            <Cell figure>
              <Quantity
                value={station.slope === null ? null : station.slope * PER_METRE}
                unit=""
                uncertainty={spread ? spread.slopeUncertainty * PER_METRE : slope}
              />
            </Cell>
            <Cell figure>
              <Quantity
                value={largest(station.commonResiduals.map((point) => point.residual)) * PER_METRE}
                unit="mm per m"
                decimals={3}
                signed
              />
            </Cell>
          </tr>
        ))}
      </tbody>
    </DataTable>
  );
}

function largest(residuals: readonly number[]): number {
  return residuals.reduce((most, each) => (Math.abs(each) > Math.abs(most) ? each : most), 0);
}
