"use client";

import { useState } from "react";
import { Button } from "@/components/ui/button";
import { ChoiceField } from "@/components/ui/choice-field";
import { ConfirmButton } from "@/components/ui/confirm-button";
import { Panel } from "@/components/ui/panel";
import type { PersonLine } from "./people-table";
import type { usePeople } from "./use-people";

export type TestNamed = { readonly id: string; readonly title: string; readonly date: string };
type PartsPanelProps = { person: PersonLine; tests: readonly TestNamed[]; onSet: ReturnType<typeof usePeople>["setRole"]; busy: boolean };

/** The parts a person has in tests. Each has a beginning and an end: an event is judged by the part held when it was made. */
export function PartsPanel({ person, tests, onSet, busy }: PartsPanelProps) {
  const [test, setTest] = useState(tests[0]?.id ?? "");
  const [role, setRole] = useState("lead");
  return (
    <Panel title="Parts in tests" aside={`${person.parts.length}`}>
      {person.parts.length === 0 ? <p className="mb-3">No part in any test.</p> : null}
      <ul className="mb-4 flex flex-col gap-2">
        {person.parts.map((part) => (
          <li key={`${part.test} ${part.role}`} className="flex flex-wrap items-center justify-between gap-2 border-ink-line border-b pb-2">
            <span>
              <strong>{part.role}</strong>: {part.title}
            </span>
            <ConfirmButton
              disabled={busy}
              question="From now on; what was done with it stays."
              yes="End it"
              onConfirm={() => onSet(part.test, { account: person.id, role: part.role, isHeld: false })}
            >
              End
            </ConfirmButton>
          </li>
        ))}
      </ul>
      {tests.length === 0 || person.isClosed ? null : (
        <form
          className="flex flex-wrap items-end gap-3"
          onSubmit={(event) => {
            event.preventDefault();
            void onSet(test, { account: person.id, role, isHeld: true });
          }}
        >
          <div className="min-w-60 flex-1">
            <ChoiceField id="part-test" label="Test" value={test} onChange={(event) => setTest(event.target.value)}>
              {tests.map(({ id, title, date }) => (
                <option key={id} value={id}>
                  {title}, {date}
                </option>
              ))}
            </ChoiceField>
          </div>
          <ChoiceField id="part-role" label="As" value={role} onChange={(event) => setRole(event.target.value)}>
            <option value="lead">Lead</option>
            <option value="engineer">Engineer</option>
            <option value="witness">Witness</option>
            <option value="reader">Reader</option>
          </ChoiceField>
          <Button type="submit" disabled={busy}>
            Give the part
          </Button>
        </form>
      )}
    </Panel>
  );
}
