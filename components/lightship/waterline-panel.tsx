import { Cell, ColumnHead, DataTable, RowHead } from "@/components/ui/data-table";
import { Facts } from "@/components/ui/facts";
import { Panel } from "@/components/ui/panel";
import { Quantity } from "@/components/ui/quantity";
import type { WaterDensity } from "@/lib/hydrostatics/water-density";
import type { Waterline } from "@/lib/hydrostatics/waterline";

type WaterlinePanelProps = { waterline: Waterline; water: WaterDensity };

/** The waterplane that all marks agree on best, and what each mark is off it. */
export function WaterlinePanel({ waterline, water }: WaterlinePanelProps) {
  return (
    <Panel title="Waterline" aside={waterline.sagFitted ? "sag from the marks" : "the marks can’t tell the sag: taken as 0"}>
      <Facts
        facts={[
          ["Draft aft", <Quantity key="aft" value={waterline.draftAft} unit="m" decimals={3} />],
          ["Draft midships", <Quantity key="mid" value={waterline.draftMidships} unit="m" decimals={3} />],
          ["Draft forward", <Quantity key="fwd" value={waterline.draftForward} unit="m" decimals={3} />],
          ["Trim, by the stern +", <Quantity key="trim" value={waterline.trim} unit="m" decimals={3} signed />],
          ["Heel, to starboard +", <Quantity key="heel" value={waterline.heelDegrees} unit="°" decimals={2} signed />],
          ["Sag, hog −", <Quantity key="sag" value={waterline.plane.sag} unit="m" decimals={3} signed />],
          ["Water", <Quantity key="water" value={water.density} unit="t/m³" decimals={4} />],
        ]}
      />
      <div className="mt-4">
        <DataTable caption="Residual of each mark" showCaption>
          <thead>
            <tr>
              <ColumnHead>Mark</ColumnHead>
              <ColumnHead figure>Measured less fitted</ColumnHead>
            </tr>
          </thead>
          <tbody>
            {Object.entries(waterline.residuals).map(([mark, residual]) => (
              <tr key={mark}>
                <RowHead>{mark}</RowHead>
                <Cell figure>
                  <Quantity value={residual * 1000} unit="mm" decimals={1} signed />
                </Cell>
              </tr>
            ))}
          </tbody>
        </DataTable>
      </div>
    </Panel>
  );
}
