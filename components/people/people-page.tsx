"use client";

import Link from "next/link";
import { useState } from "react";
import { Disclosure } from "@/components/ui/disclosure";
import { PageTitle } from "@/components/ui/page-title";
import { Panel } from "@/components/ui/panel";
import { TextField } from "@/components/ui/text-field";
import { InviteForm } from "./invite-form";
import { PeopleTable, type PersonLine } from "./people-table";

/** Everybody who has an account on this server, and the way to let one more in. */
export function PeoplePage({ people }: { people: readonly PersonLine[] }) {
  const [sought, setSought] = useState("");
  const word = sought.trim().toLowerCase();
  const found = people.filter(({ name, email, parts }) =>
    [name, email ?? "", ...parts.map(({ title }) => title)].some((text) => text.toLowerCase().includes(word)),
  );
  return (
    <>
      <PageTitle title="People" over="Accounts on this server">
        <Link href="/people/mail" prefetch={false} className="inline-flex min-h-tap items-center text-small underline underline-offset-4">
          Mail kept here
        </Link>
      </PageTitle>
      <div className="flex flex-col gap-5">
        <Panel title="Let somebody in">
          <p className="mb-3 max-w-hand text-ink-soft text-small">
            For lead, engineer, witness and administrator, who sign in with a password. Readers need no account: the lead makes a code for
            each phone at central control.
          </p>
          <Disclosure title="Invite by e-mail">
            <InviteForm />
          </Disclosure>
        </Panel>
        <Panel title="Accounts" aside={`${found.length} of ${people.length}`}>
          <div className="mb-3 max-w-hand">
            <TextField
              id="seek-person"
              type="search"
              label="Find by name, address or test"
              value={sought}
              onChange={(event) => setSought(event.target.value)}
            />
          </div>
          <PeopleTable people={found} />
        </Panel>
      </div>
    </>
  );
}
