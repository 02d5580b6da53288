import { sha256Hex } from "@/lib/ledger/sha256";
import type { Envelope } from "./protocol";

/** SHA-256 over an envelope, body and signature: the phone compares what was received with what it sent. */
export function envelopeHash({ body, signature }: Envelope): string {
  return sha256Hex(`${body}\n${signature ?? ""}`);
}
