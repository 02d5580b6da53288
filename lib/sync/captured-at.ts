/** The moment of an act by the server's clock: the phone's time plus the last offset it measured [ms since 1970]. */
export function capturedAt(act: { readonly capturedAt: string; readonly clockOffsetMs: number | null }): number {
  return Date.parse(act.capturedAt) + (act.clockOffsetMs ?? 0);
}
