/**
 * The code as an address carries it: `/join#code=ABCD-EFGH`, so that it never reaches a server's log; a query is understood as well.
 * Empty where there is none.
 */
export function codeInAddress(address: { readonly hash: string; readonly search: string }): string {
  const fragment = new URLSearchParams(address.hash.replace(/^#/, ""));
  return writtenCode(fragment.get("code") ?? new URLSearchParams(address.search).get("code") ?? "");
}

/** A code as it is shown: capitals, four and four. */
export function writtenCode(typed: string): string {
  const letters = typed
    .toUpperCase()
    .replaceAll(/[^0-9A-Z]/g, "")
    .slice(0, 8);
  return letters.length > 4 ? `${letters.slice(0, 4)}-${letters.slice(4)}` : letters;
}

export function isWholeCode(code: string): boolean {
  return /^[0-9A-Z]{4}-[0-9A-Z]{4}$/.test(code);
}
