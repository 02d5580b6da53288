import { Disclosure } from "@/components/ui/disclosure";
import { Panel } from "@/components/ui/panel";
import type { TestRecord } from "@/lib/record/test-record";
import { SettingsForm } from "./settings-form";
import { UncertaintyForm } from "./uncertainty-form";

/** What the engineer states and chooses for a test; before there is a result as well as after. */
export function SettingsPanel({ record }: { record: TestRecord }) {
  return (
    <Panel title="Settings of this test" aside="for the engineer">
      <Disclosure title="Standard uncertainties of this test">
        <UncertaintyForm test={record.test.id} stated={record.uncertainty} />
      </Disclosure>
      <Disclosure title="Method, weights and limits of this test">
        <SettingsForm test={record.test.id} settings={record.settings} />
      </Disclosure>
    </Panel>
  );
}
