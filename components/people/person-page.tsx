"use client";

import Link from "next/link";
import { useState } from "react";
import { Button } from "@/components/ui/button";
import { ConfirmButton } from "@/components/ui/confirm-button";
import { Notice } from "@/components/ui/notice";
import { PageTitle } from "@/components/ui/page-title";
import { Panel } from "@/components/ui/panel";
import { InvitationMade } from "./invitation-made";
import { PartsPanel, type TestNamed } from "./parts-panel";
import { type PersonLine, standingInWords } from "./people-table";
import { type PhoneLine, PhonesPanel } from "./phones-panel";
import { type Invitation, usePeople } from "./use-people";

type Shown = PersonLine & { readonly devices: readonly PhoneLine[] };
type PersonPageProps = { person: Shown; tests: readonly TestNamed[]; isSelf: boolean };

/** One account: what its person may do here, the parts in tests, the phones, and the ways to change each. */
export function PersonPage({ person, tests, isSelf }: PersonPageProps) {
  const people = usePeople();
  const [invitation, setInvitation] = useState<Invitation | null>(null);
  const standing = { isAdministrator: person.isAdministrator, isEngineer: person.isEngineer, isClosed: person.isClosed };
  const change = (to: Partial<typeof standing>) => people.setStanding(person.id, { ...standing, ...to });
  return (
    <>
      <PageTitle title={person.name} over={<Link href="/people">People</Link>} />
      <div className="flex flex-col gap-5">
        {people.refused ? <Notice tone="refused">{people.refused}</Notice> : null}
        <Panel title="Account" aside={standingInWords(person)}>
          <p className="mb-3">{person.email ?? "No e-mail: known by an enrolled phone or from a record file."}</p>
          <div className="flex flex-wrap gap-2">
            <Button disabled={people.busy || person.isClosed} onClick={() => change({ isEngineer: !person.isEngineer })}>
              {person.isEngineer ? "No longer an engineer" : "Make an engineer"}
            </Button>
            <ConfirmButton
              disabled={people.busy || person.isClosed}
              question={person.isAdministrator ? "No longer an administrator?" : "An administrator sees every test and every account."}
              yes={person.isAdministrator ? "Take it away" : "Make an administrator"}
              onConfirm={() => change({ isAdministrator: !person.isAdministrator })}
            >
              {person.isAdministrator ? "No longer an administrator" : "Make an administrator"}
            </ConfirmButton>
            {person.email !== null && !person.isClosed ? (
              <Button disabled={people.busy} onClick={async () => setInvitation(await people.inviteAgain(person.id))}>
                Send a link for a new password
              </Button>
            ) : null}
            {person.isClosed ? (
              <Button disabled={people.busy} onClick={() => change({ isClosed: false })}>
                Open the account again
              </Button>
            ) : (
              <ConfirmButton
                disabled={people.busy || isSelf}
                question="Signs the person out everywhere, at once. What was done stays."
                yes="Close the account"
                onConfirm={() => change({ isClosed: true })}
              >
                Close the account
              </ConfirmButton>
            )}
          </div>
          {invitation ? (
            <div className="mt-4">
              <InvitationMade invitation={invitation} name={person.name} />
            </div>
          ) : null}
        </Panel>
        <PartsPanel person={person} tests={tests} onSet={people.setRole} busy={people.busy} />
        <PhonesPanel phones={person.devices} tests={person.parts} onStop={people.stopPhone} busy={people.busy} />
      </div>
    </>
  );
}
