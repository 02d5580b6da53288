import { ConfirmButton } from "@/components/ui/confirm-button";
import { Panel } from "@/components/ui/panel";
import { TimeOfDay } from "@/components/ui/time-of-day";
import type { PersonLine } from "./people-table";
import type { usePeople } from "./use-people";

export type PhoneLine = {
  readonly device: string;
  readonly name: string;
  readonly enrolledAt: string;
  readonly lastHeardAt: string | null;
  readonly revokedAt: string | null;
  readonly holds: number;
};
type PhonesPanelProps = {
  phones: readonly PhoneLine[];
  tests: PersonLine["parts"];
  onStop: ReturnType<typeof usePeople>["stopPhone"];
  busy: boolean;
};

/** The phones and laptops a person has held. One that is lost or stolen is stopped here. */
export function PhonesPanel({ phones, tests, onStop, busy }: PhonesPanelProps) {
  const test = tests[0]?.test;
  return (
    <Panel title="Phones and laptops" aside={`${phones.length}`}>
      {phones.length === 0 ? <p>None. A phone is let in by a code from central control.</p> : null}
      <ul className="flex flex-col gap-2">
        {phones.map(({ device, name, enrolledAt, lastHeardAt, revokedAt, holds }) => (
          <li key={device} className="flex flex-wrap items-center justify-between gap-2 border-ink-line border-b pb-2 last:border-b-0">
            <span>
              <strong>{name}</strong>, let in <TimeOfDay at={enrolledAt} dated />
              {lastHeardAt === null ? ", never heard" : ", last heard "}
              {lastHeardAt === null ? null : <TimeOfDay at={lastHeardAt} dated />}
              {holds > 0 ? `, holds ${holds} unsent` : ""}
            </span>
            {revokedAt !== null ? (
              <span className="text-ink-soft">
                stopped <TimeOfDay at={revokedAt} dated />
              </span>
            ) : test === undefined ? null : (
              <ConfirmButton
                disabled={busy}
                question="What it has sent stands; what it still sends is set aside."
                yes="Stop it"
                onConfirm={() => onStop(test, device)}
              >
                Stop this phone
              </ConfirmButton>
            )}
          </li>
        ))}
      </ul>
    </Panel>
  );
}
