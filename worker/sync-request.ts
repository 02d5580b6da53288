import { type SyncAnswer, type SyncRequest, syncAnswerSchema } from "@/lib/sync/protocol";
import { retryAfterMs } from "@/lib/sync/retry";

/** What the flush needs from outside, so that tests can bring their own network, clock and chance. */
export type Surroundings = { readonly fetch: typeof fetch; readonly now: () => number; readonly chance: () => number };

export const browser: Surroundings = {
  fetch: (input, init) => fetch(input, init),
  now: () => Date.now(),
  chance: () => Math.random(),
};

const PATIENCE_MS = 10_000;

export type Heard =
  | { readonly type: "answer"; readonly answer: SyncAnswer; readonly clockOffsetMs: number }
  | { readonly type: "sign-in-needed" }
  | { readonly type: "too-large" }
  | { readonly type: "no-answer"; readonly retryAfterMs: number | null };

/**
 * Sends one request and tells what came back. Reached means a JSON answer of the protocol: a redirect or a page of HTML is a
 * captive portal, and counts as silence whatever its status says. Aborted after 10 s.
 */
export async function sync(request: SyncRequest, { fetch, now }: Surroundings): Promise<Heard> {
  const sentAt = now();
  try {
    const response = await fetch("/api/v1/sync", {
      method: "POST",
      headers: { "content-type": "application/json", accept: "application/json" },
      body: JSON.stringify(request),
      credentials: "same-origin",
      redirect: "manual",
      cache: "no-store",
      signal: AbortSignal.timeout(PATIENCE_MS),
    });
    return await heardIn(response, sentAt, now);
  } catch {
    return silence(null);
  }
}

async function heardIn(response: Response, sentAt: number, now: () => number): Promise<Heard> {
  if (response.type === "opaqueredirect" || response.redirected || isPage(response)) return silence(null);
  if (response.status === 401 || response.status === 403) return { type: "sign-in-needed" };
  if (response.status === 413) return { type: "too-large" };
  if (response.status !== 200) return silence(retryAfterMs(response.headers.get("retry-after"), now()));
  const answer = syncAnswerSchema.safeParse(await response.json());
  if (!answer.success) return silence(null);
  return { type: "answer", answer: answer.data, clockOffsetMs: offset(answer.data.server.time, sentAt, now()) };
}

function silence(retryAfterMs: number | null): Heard {
  return { type: "no-answer", retryAfterMs };
}

function isPage(response: Response): boolean {
  return (response.headers.get("content-type") ?? "").includes("text/html");
}

/** The server's clock less the phone's, taken half way between question and answer [ms]. */
function offset(serverTime: string, sentAt: number, heardAt: number): number {
  return Math.round(Date.parse(serverTime) - (sentAt + heardAt) / 2);
}
