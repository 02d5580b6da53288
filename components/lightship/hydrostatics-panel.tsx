import { Facts } from "@/components/ui/facts";
import { Panel } from "@/components/ui/panel";
import { Quantity } from "@/components/ui/quantity";
import type { ShipHydrostatics } from "@/lib/inclining/ship-afloat";
import type { IncliningResult } from "@/lib/lightship/inclining-result";
import { inclinedDigits } from "@/lib/report/result-digits";

type HydrostaticsPanelProps = { hydrostatics: ShipHydrostatics; asInclined: IncliningResult["asInclined"] };

/** The hydrostatics that were used, and the ship as inclined that follows from them. */
export function HydrostaticsPanel({ hydrostatics: used, asInclined }: HydrostaticsPanelProps) {
  const digits = inclinedDigits(asInclined.uncertainty);
  const metres = (value: number, decimals = 3, signed = false) => <Quantity value={value} unit="m" decimals={decimals} signed={signed} />;
  return (
    <Panel title="Hydrostatics and as inclined" aside={used.source === "offsets" ? "from the hull’s offsets" : "from the table"}>
      <Facts
        facts={[
          ["Volume", <Quantity key="volume" value={used.volume} unit="m³" decimals={1} />],
          ["Displacement", <Quantity key="displacement" value={used.displacement} unit="t" decimals={digits.displacement} />],
          ["LCB forward of AP", metres(used.lcb)],
          ["KB", metres(used.vcb)],
          ["KM transverse, at the measured list", metres(used.kmt)],
          ["KM longitudinal", <Quantity key="kml" value={used.kml} unit="m" decimals={1} />],
          ["LCF forward of AP", metres(used.lcf)],
          ["GM fluid", metres(asInclined.gmFluid, digits.gm)],
          ["Free surface", metres(asInclined.freeSurfaceCorrection, digits.gm)],
          ["GM solid", metres(asInclined.gmSolid, digits.gm)],
          ["KG, as inclined", metres(asInclined.vcg, digits.vcg)],
          ["LCG, as inclined", metres(asInclined.lcg, digits.lcg)],
          ["TCG, as inclined", metres(asInclined.tcg, digits.tcg, true)],
        ]}
      />
    </Panel>
  );
}
