import "client-only";

/** ECDSA P-256 with SHA-256 over the body's UTF-8 bytes, base64url; null where this phone has no key. */
export async function signatureOf(body: string, keys: CryptoKeyPair | null): Promise<string | null> {
  if (!keys) return null;
  const bytes = await crypto.subtle.sign({ name: "ECDSA", hash: "SHA-256" }, keys.privateKey, new TextEncoder().encode(body));
  return base64Url(new Uint8Array(bytes));
}

function base64Url(bytes: Uint8Array): string {
  return btoa(String.fromCharCode(...bytes))
    .replaceAll("+", "-")
    .replaceAll("/", "_")
    .replaceAll("=", "");
}
