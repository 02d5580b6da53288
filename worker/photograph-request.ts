import { retryAfterMs } from "@/lib/sync/retry";
import type { Surroundings } from "./sync-request";

/** A photograph is some hundred times an event: on a slow line it takes longer than a batch may. */
const PATIENCE_MS = 60_000;

export type PhotographHeard =
  | { readonly type: "taken" }
  /** the event that names it is not there, or it broke on its way, or the server will not have it: the others go on */
  | { readonly type: "refused"; readonly sentence: string }
  | { readonly type: "sign-in-needed" }
  | { readonly type: "no-answer"; readonly retryAfterMs: number | null };

type Sent = { readonly sha256: string; readonly type: string; readonly bytes: Uint8Array<ArrayBuffer> };

/** Sends one photograph. Taken means an answer that names its hash: whatever else comes back with 200 is a captive portal. */
export async function sentPhotograph({ sha256, type, bytes }: Sent, around: Surroundings): Promise<PhotographHeard> {
  try {
    const given = { method: "PUT", headers: { "content-type": type, accept: "application/json" }, body: bytes };
    const response = await around.fetch(addressOf(sha256), { ...given, ...asked() });
    return await heardIn(response, sha256, around.now());
  } catch {
    return silence(null);
  }
}

/** Whether the server says that it has a photograph; its name comes back as the tag. */
export async function isOnServer(sha256: string, { fetch }: Surroundings): Promise<boolean> {
  const response = await fetch(addressOf(sha256), { method: "HEAD", ...asked() }).catch(() => null);
  return response?.status === 200 && response.headers.get("etag") === `"${sha256}"`;
}

function addressOf(sha256: string): string {
  return `/api/v1/photographs/${sha256}`;
}

function asked() {
  return { credentials: "same-origin", redirect: "manual", cache: "no-store", signal: AbortSignal.timeout(PATIENCE_MS) } as const;
}

async function heardIn(response: Response, sha256: string, now: number): Promise<PhotographHeard> {
  if (response.type === "opaqueredirect" || response.redirected) return silence(null);
  if (!(response.headers.get("content-type") ?? "").includes("application/json")) return silence(null);
  if (response.status === 401 || response.status === 403) return { type: "sign-in-needed" };
  const said = (await response.json()) as { readonly sha256?: unknown; readonly error?: unknown };
  if (response.status === 200 || response.status === 201) return said.sha256 === sha256 ? { type: "taken" } : silence(null);
  if (refusals.includes(response.status) && typeof said.error === "string") return { type: "refused", sentence: said.error };
  return silence(retryAfterMs(response.headers.get("retry-after"), now));
}

const refusals: readonly number[] = [400, 409, 413, 415, 422];

function silence(retryAfterMs: number | null): PhotographHeard {
  return { type: "no-answer", retryAfterMs };
}
