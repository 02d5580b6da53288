"use client";

import { zodResolver } from "@hookform/resolvers/zod";
import { useState } from "react";
import { useForm } from "react-hook-form";
import { Button } from "@/components/ui/button";
import { Notice } from "@/components/ui/notice";
import { TextField } from "@/components/ui/text-field";
import { type NewPerson, newPersonSchema } from "@/lib/people/new-person";
import { InvitationMade } from "./invitation-made";
import { type Invitation, usePeople } from "./use-people";

const nobody: NewPerson = { name: "", email: "", isAdministrator: false, isEngineer: false };

/** Makes an account; its person sets the password by the link that goes out. */
export function InviteForm() {
  const { invite, busy, refused } = usePeople();
  const [made, setMade] = useState<(Invitation & { name: string }) | null>(null);
  const form = useForm<NewPerson>({ resolver: zodResolver(newPersonSchema), defaultValues: nobody });
  const { errors } = form.formState;
  const send = form.handleSubmit(async (person) => {
    const invitation = await invite(person);
    setMade(invitation ? { ...invitation, name: person.name } : null);
    if (invitation) form.reset();
  });
  return (
    <div className="flex flex-col gap-4">
      <form onSubmit={send} noValidate className="grid gap-3 sm:grid-cols-2">
        <TextField id="invite-name" label="Name" autoComplete="off" error={errors.name?.message} {...form.register("name")} />
        <TextField
          id="invite-email"
          type="email"
          label="E-mail"
          autoComplete="off"
          error={errors.email?.message}
          {...form.register("email")}
        />
        <fieldset className="sm:col-span-2">
          <legend className="font-bold text-small">May do on this server</legend>
          <label className="flex min-h-tap items-center gap-3">
            <input type="checkbox" className="h-5 w-5 shrink-0 accent-redlead" {...form.register("isEngineer")} />
            Engineer: makes vessels and tests
          </label>
          <label className="flex min-h-tap items-center gap-3">
            <input type="checkbox" className="h-5 w-5 shrink-0 accent-redlead" {...form.register("isAdministrator")} />
            Administrator: accounts, backups, every test
          </label>
        </fieldset>
        <div>
          <Button type="submit" weight="now" disabled={busy}>
            {busy ? "Inviting" : "Invite"}
          </Button>
        </div>
      </form>
      {refused ? <Notice tone="refused">{refused}</Notice> : null}
      {made ? <InvitationMade invitation={made} name={made.name} /> : null}
    </div>
  );
}
