import { Facts } from "@/components/ui/facts";
import { Panel } from "@/components/ui/panel";
import { Quantity } from "@/components/ui/quantity";
import type { WaterDensity } from "@/lib/hydrostatics/water-density";
import type { Finding } from "@/lib/inclining/checks/finding";
import type { IncliningResult } from "@/lib/lightship/inclining-result";
import { foundWords } from "@/lib/report/check-words";
import { roundFigures } from "@/lib/report/waterline-lines";
import { MarksTable } from "./marks-table";
import { RoundsTable } from "./rounds-table";

type WaterlinePanelProps = { waterline: IncliningResult["waterline"]; water: WaterDensity; checks: readonly Finding[] };

/** The waterplane that all marks agree on best, what each mark is off it, and what changed until after the moves. */
export function WaterlinePanel({ waterline, water, checks }: WaterlinePanelProps) {
  const { after, marks } = waterline;
  return (
    <Panel title="Waterline" aside={waterline.sagFitted ? "sag from the marks" : "the marks can’t tell the sag: taken as 0"}>
      <Facts
        facts={[
          ...roundFigures.map(({ key, name, ...digits }) => [name, <Quantity key={key} value={waterline[key]} {...digits} />] as const),
          ["Water", <Quantity key="water" value={water.density} unit="t/m³" decimals={4} />],
        ]}
      />
      <div className="mt-4">
        <MarksTable marks={marks} />
        <Found checks={checks} id="mark-agreement" />
      </div>
      <div className="mt-4">
        {after === null ? <p className="text-small">The marks were not read both before and after the moves.</p> : null}
        {after === null ? null : <RoundsTable before={waterline} after={after} />}
        <Found checks={checks} id="drafts-before-after" />
      </div>
    </Panel>
  );
}

function Found({ checks, id }: { checks: readonly Finding[]; id: Finding["id"] }) {
  const finding = checks.find((each) => each.id === id);
  if (!finding) return null;
  const words = foundWords(finding);
  const look = finding.verdict === "met" ? "" : "border-redlead border-l-4 bg-redlead-wash px-3 py-1 font-bold";
  return <p className={`mt-2 text-small ${look}`}>{`${words.charAt(0).toUpperCase()}${words.slice(1)}.`}</p>;
}
