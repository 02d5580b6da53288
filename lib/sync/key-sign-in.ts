/**
 * What a phone signs with its own key to be signed in again without a code. The token is the server's, made for this one
 * sign-in: a signature that somebody has overheard opens nothing.
 */
export function signInText(device: string, token: string): string {
  return `battenbook sign-in ${device} ${token}`;
}
