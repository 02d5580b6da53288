"use client";

import { zodResolver } from "@hookform/resolvers/zod";
import Link from "next/link";
import { useState } from "react";
import { useForm } from "react-hook-form";
import { z } from "zod";
import { Button } from "@/components/ui/button";
import { Notice } from "@/components/ui/notice";
import { TextField } from "@/components/ui/text-field";
import { newPasswordSchema } from "@/lib/people/new-password";
import { setPassword } from "./use-password";

const schema = z
  .object({ password: newPasswordSchema, again: z.string() })
  .refine(({ password, again }) => password === again, { path: ["again"], message: "The two are not the same." });
type Typed = z.infer<typeof schema>;

/** Typed twice, since it can't be seen. */
export function SetPassword({ token }: { token: string }) {
  const [refused, setRefused] = useState<string | null>(null);
  const [isSet, setIsSet] = useState(false);
  const form = useForm<Typed>({ resolver: zodResolver(schema), defaultValues: { password: "", again: "" } });
  const { errors, isSubmitting } = form.formState;
  const save = form.handleSubmit(async ({ password }) => {
    const sentence = await setPassword(token, password);
    setRefused(sentence);
    setIsSet(sentence === null);
  });
  if (isSet) {
    return (
      <Notice title="Your password is set">
        <Link href="/sign-in" prefetch={false} className="inline-flex min-h-tap items-center underline underline-offset-4">
          Sign in with it
        </Link>
      </Notice>
    );
  }
  return (
    <form onSubmit={save} noValidate className="flex flex-col gap-4">
      {refused ? <Notice tone="refused">{refused}</Notice> : null}
      <TextField
        id="password"
        type="password"
        label="New password"
        hint="At least 12 characters; a few words do."
        autoComplete="new-password"
        error={errors.password?.message}
        {...form.register("password")}
      />
      <TextField
        id="again"
        type="password"
        label="The same again"
        autoComplete="new-password"
        error={errors.again?.message}
        {...form.register("again")}
      />
      <Button type="submit" weight="now" disabled={isSubmitting} className="min-h-key">
        {isSubmitting ? "Setting it" : "Set the password"}
      </Button>
    </form>
  );
}
