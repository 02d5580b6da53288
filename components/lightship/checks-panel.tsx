import { Cell, ColumnHead, DataTable, RowHead } from "@/components/ui/data-table";
import { Panel } from "@/components/ui/panel";
import { Sign, type SignKind } from "@/components/ui/sign";
import type { Finding, Verdict } from "@/lib/inclining/checks/finding";
import { checkSource } from "@/lib/report/check-sources";
import { checkName, foundWords, limitWords, verdictWord } from "@/lib/report/check-words";

/** What a surveyor would look at: found beside limit. The engineer decides; no verdict stops the result. */
export function ChecksPanel({ checks }: { checks: readonly Finding[] }) {
  return (
    <Panel title="Checks" aside={countedInWords(checks)}>
      <DataTable caption="Checks of the test" className="min-w-[52rem]">
        <thead>
          <tr>
            <ColumnHead>Check</ColumnHead>
            <ColumnHead>Found</ColumnHead>
            <ColumnHead>Limit</ColumnHead>
            <ColumnHead>Verdict</ColumnHead>
            <ColumnHead>Where the limit comes from</ColumnHead>
          </tr>
        </thead>
        <tbody>
          {checks.map((finding) => (
            <CheckRow key={finding.id} finding={finding} />
          ))}
        </tbody>
      </DataTable>
      <p className="mt-3 text-ink-soft text-small">
        Findings, not errors: the engineer decides. A limit called a setting is no standard’s; no standard gives a number for straightness.
      </p>
    </Panel>
  );
}

function CheckRow({ finding }: { finding: Finding }) {
  return (
    <tr className={finding.verdict === "met" ? "" : "bg-redlead-wash"}>
      <RowHead className="font-normal">{checkName(finding.id)}</RowHead>
      <Cell>{foundWords(finding)}</Cell>
      <Cell>{limitWords(finding)}</Cell>
      <Cell className={`whitespace-nowrap ${finding.verdict === "not-met" ? "font-bold text-redlead-text" : ""}`}>
        <Sign kind={signs[finding.verdict]} className="mr-1.5 h-3.5 w-3.5" />
        {verdictWord(finding.verdict)}
      </Cell>
      <Cell className="text-ink-soft text-small">{checkSource(finding)}</Cell>
    </tr>
  );
}

const signs: Readonly<Record<Verdict, SignKind>> = { met: "read", attention: "alert", "not-met": "disagrees" };

function countedInWords(checks: readonly Finding[]): string {
  const count = (verdict: Verdict) => checks.filter((finding) => finding.verdict === verdict).length;
  const verdicts: readonly Verdict[] = ["not-met", "attention", "met"];
  return verdicts.flatMap((verdict) => (count(verdict) === 0 ? [] : [`${count(verdict)} ${verdictWord(verdict)}`])).join(", ");
}
