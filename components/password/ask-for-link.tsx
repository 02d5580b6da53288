"use client";

import { type FormEvent, useState } from "react";
import { Button } from "@/components/ui/button";
import { Notice } from "@/components/ui/notice";
import { TextField } from "@/components/ui/text-field";
import { askForLink } from "./use-password";

/** For whoever has forgotten a password. The answer never tells whether there is such an account. */
export function AskForLink() {
  const [email, setEmail] = useState("");
  const [refused, setRefused] = useState<string | null>(null);
  const [isAsked, setIsAsked] = useState(false);
  const ask = async (event: FormEvent) => {
    event.preventDefault();
    const sentence = await askForLink(email.trim());
    setRefused(sentence);
    setIsAsked(sentence === null);
  };
  if (isAsked) {
    return (
      <Notice title="If there is such an account, a link is on its way">
        It works once, for two hours. On board, where no mail goes, ask the administrator for a link.
      </Notice>
    );
  }
  return (
    <form onSubmit={ask} noValidate className="flex flex-col gap-4">
      {refused ? <Notice tone="refused">{refused}</Notice> : null}
      <TextField
        id="email"
        type="email"
        label="E-mail"
        hint="The address of your account: a link to set a new password goes there."
        autoComplete="username"
        value={email}
        onChange={(event) => setEmail(event.target.value)}
      />
      <Button type="submit" weight="now" className="min-h-key">
        Send me a link
      </Button>
    </form>
  );
}
