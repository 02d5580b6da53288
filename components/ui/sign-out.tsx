"use client";

import { signOut } from "next-auth/react";
import { Button } from "./button";

/** Ends the session; what was read on this device stays on it. */
export function SignOut() {
  return (
    <Button weight="quiet" onClick={() => signOut({ callbackUrl: "/" })}>
      Sign out
    </Button>
  );
}
