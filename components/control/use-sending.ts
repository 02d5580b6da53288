"use client";

import { useEffect } from "react";
import { startSending } from "@/worker/sync-client";

/** Sends what this device holds while the page is open, as a phone does. */
export function useSending(): void {
  useEffect(startSending, []);
}
