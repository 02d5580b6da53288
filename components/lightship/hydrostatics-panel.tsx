import { Facts } from "@/components/ui/facts";
import { Panel } from "@/components/ui/panel";
import { Quantity } from "@/components/ui/quantity";
import type { AsInclined } from "@/lib/inclining/inclined-ship";
import type { ShipHydrostatics } from "@/lib/inclining/ship-afloat";

type HydrostaticsPanelProps = { hydrostatics: ShipHydrostatics; asInclined: AsInclined };

/** The hydrostatics that were used, and the ship as inclined that follows from them. */
export function HydrostaticsPanel({ hydrostatics: used, asInclined }: HydrostaticsPanelProps) {
  const metres = (value: number | null, signed = false) => <Quantity value={value} unit="m" decimals={3} signed={signed} />;
  return (
    <Panel title="Hydrostatics and as inclined" aside={used.source === "offsets" ? "from the hull’s offsets" : "from the table"}>
      <Facts
        facts={[
          ["Volume", <Quantity key="volume" value={used.volume} unit="m³" decimals={1} />],
          ["Displacement", <Quantity key="displacement" value={used.displacement} unit="t" decimals={1} />],
          ["LCB forward of AP", metres(used.lcb)],
          ["KB", metres(used.vcb)],
          ["KM transverse, at the measured list", metres(used.kmt)],
          ["KM longitudinal", <Quantity key="kml" value={used.kml} unit="m" decimals={1} />],
          ["LCF forward of AP", metres(used.lcf)],
          ["GM fluid", metres(asInclined.gmFluid)],
          ["Free surface", metres(asInclined.freeSurfaceCorrection)],
          ["GM solid", metres(asInclined.gmSolid)],
          ["KG, as inclined", metres(asInclined.vcg)],
          ["LCG, as inclined", metres(asInclined.lcg)],
          ["TCG, as inclined", metres(asInclined.tcg, true)],
        ]}
      />
    </Panel>
  );
}
