"use client";

import { zodResolver } from "@hookform/resolvers/zod";
import { signIn } from "next-auth/react";
import { useState } from "react";
import { useForm } from "react-hook-form";
import { z } from "zod";
import { Button } from "@/components/ui/button";
import { Notice } from "@/components/ui/notice";
import { TextField } from "@/components/ui/text-field";

const schema = z.object({
  email: z.email("Write the whole address, as name@yard.example."),
  password: z.string().min(1, "Write your password."),
});
type Credentials = z.infer<typeof schema>;

/** Signs a person in and then loads a whole page, so that nothing of the one before is left. */
export function SignInForm({ next }: { next: string }) {
  const [refused, setRefused] = useState<string | null>(null);
  const form = useForm<Credentials>({ resolver: zodResolver(schema), defaultValues: { email: "", password: "" } });
  const { errors, isSubmitting } = form.formState;
  const enter = form.handleSubmit(async (credentials) => {
    const sentence = await signedIn(credentials);
    setRefused(sentence);
    if (sentence === null) window.location.assign(next);
  });
  return (
    <form onSubmit={enter} noValidate className="flex flex-col gap-4">
      {refused ? <Notice tone="refused">{refused}</Notice> : null}
      <TextField id="email" type="email" label="E-mail" autoComplete="username" error={errors.email?.message} {...form.register("email")} />
      <TextField
        id="password"
        type="password"
        label="Password"
        autoComplete="current-password"
        error={errors.password?.message}
        {...form.register("password")}
      />
      <Button type="submit" weight="now" disabled={isSubmitting} className="min-h-key">
        {isSubmitting ? "Signing in" : "Sign in"}
      </Button>
    </form>
  );
}

/** null when the door is open, else why it is not. */
async function signedIn(credentials: Credentials): Promise<string | null> {
  try {
    const answer = await signIn("credentials", { ...credentials, redirect: false });
    if (answer?.ok) return null;
    if (answer?.error === "TooManyAttempts") return "Too many attempts. Wait a while and try again.";
    return "No account has this e-mail and password together.";
  } catch {
    return "The server does not answer. Check that this device is on the ship's or the office's network.";
  }
}
