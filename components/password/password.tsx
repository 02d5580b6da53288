"use client";

import { useSyncExternalStore } from "react";
import { AskForLink } from "./ask-for-link";
import { SetPassword } from "./set-password";

/** With a link: set it. Without: ask for one. */
export function Password() {
  const token = useSyncExternalStore(onAddress, tokenInAddress, () => null);
  if (token === null) return null;
  return token === "" ? <AskForLink /> : <SetPassword token={token} />;
}

function onAddress(changed: () => void) {
  window.addEventListener("hashchange", changed);
  return () => window.removeEventListener("hashchange", changed);
}

function tokenInAddress(): string {
  return new URLSearchParams(window.location.hash.replace(/^#/, "")).get("token") ?? "";
}
