export type EnrolmentCredentials = {
  readonly code: string;
  readonly device: string;
  readonly deviceName: string;
  readonly publicKey: string;
};

/** Signs this phone in by its code, or throws a sentence that says why not. The server's sign-in is spoken to directly: a phone needs no more of it. */
export async function signedIn(credentials: EnrolmentCredentials): Promise<void> {
  const csrfToken = await token();
  const response = await fetch("/api/auth/callback/enrolment", {
    method: "POST",
    headers: { "content-type": "application/x-www-form-urlencoded" },
    body: new URLSearchParams({ ...credentials, csrfToken, callbackUrl: "/readings", json: "true" }),
    credentials: "same-origin",
  }).catch(() => null);
  if (!response) throw new Error("The server did not answer. Stay where there is signal and try again.");
  const answer = (await response.json().catch(() => ({}))) as { url?: string };
  const refused = new URL(answer.url ?? "/", location.origin).searchParams.get("error");
  if (response.ok && refused === null) return;
  throw new Error(sentenceOf(refused));
}

async function token(): Promise<string> {
  const answer = await fetch("/api/auth/csrf", { credentials: "same-origin", cache: "no-store" })
    .then((response) => response.json() as Promise<{ csrfToken?: string }>)
    .catch(() => null);
  if (typeof answer?.csrfToken !== "string") throw new Error("The server did not answer. Stay where there is signal and try again.");
  return answer.csrfToken;
}

function sentenceOf(refused: string | null): string {
  if (refused === null || refused === "CredentialsSignin")
    return "The server does not know this code. It may be mistyped, used or too old: ask the lead for a new one.";
  return refused;
}
