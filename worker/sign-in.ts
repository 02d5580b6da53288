import { deviceIdentity } from "@/db/device/device-identity";
import { signatureOf } from "@/db/device/signature";
import { signInText } from "@/lib/sync/key-sign-in";
import { browser, type Surroundings } from "./sync-request";

/** The server's sign-in is spoken to directly: a phone needs no more of it. */

export type EnrolmentCredentials = {
  readonly code: string;
  readonly device: string;
  readonly deviceName: string;
  readonly publicKey: string;
};

/** Signs this phone in by its code, or throws a sentence that says why not. */
export async function signedInByCode(credentials: EnrolmentCredentials): Promise<void> {
  const token = await tokenOf(browser);
  const answer = token === null ? null : await posted("enrolment", { ...credentials, csrfToken: token }, browser);
  if (answer === null) throw new Error("The server did not answer. Stay where there is signal and try again.");
  if (!answer.ok) throw new Error(sentenceOf(answer.refused));
}

/**
 * Signs this phone in by its own key: a cookie that has run out, or was lost with a battery, costs no new code. False
 * where the phone has no key, or the server will not have it.
 */
export async function signedInByKey(around: Surroundings): Promise<boolean> {
  const identity = await deviceIdentity();
  if (!identity?.keys) return false;
  const csrfToken = await tokenOf(around);
  if (csrfToken === null) return false;
  const signature = await signatureOf(signInText(identity.device, csrfToken), identity.keys);
  const answer = await posted("device", { device: identity.device, signature: signature ?? "", csrfToken }, around);
  return answer?.ok ?? false;
}

async function tokenOf({ fetch }: Surroundings): Promise<string | null> {
  const answer = await fetch("/api/auth/csrf", { credentials: "same-origin", cache: "no-store" })
    .then((response) => response.json() as Promise<{ csrfToken?: unknown }>)
    .catch(() => null);
  return typeof answer?.csrfToken === "string" ? answer.csrfToken : null;
}

type Answer = { readonly ok: boolean; readonly refused: string | null };

/** Null: nobody answered. */
async function posted(provider: string, form: Record<string, string>, { fetch }: Surroundings): Promise<Answer | null> {
  const response = await fetch(`/api/auth/callback/${provider}`, {
    method: "POST",
    headers: { "content-type": "application/x-www-form-urlencoded" },
    body: new URLSearchParams({ ...form, callbackUrl: "/readings", json: "true" }),
    credentials: "same-origin",
  }).catch(() => null);
  if (!response) return null;
  const answer = (await response.json().catch(() => ({}))) as { url?: string };
  const refused = new URL(answer.url ?? "/", "http://battenbook").searchParams.get("error");
  return { ok: response.ok && refused === null, refused };
}

function sentenceOf(refused: string | null): string {
  if (refused === null || refused === "CredentialsSignin")
    return "The server does not know this code. It may be mistyped, used or too old: ask the lead for a new one.";
  return refused;
}
