import { useEffect } from "react";
import { sendNow, startSending } from "@/worker/sync-client";

/** Keeps the queue moving for as long as the page is open. */
export function useSending(): void {
  useEffect(() => startSending(), []);
}

/** The button's wish: try now, whatever wait is running. */
export function sendHeldEvents(): Promise<void> {
  return sendNow(true);
}
