const minute = 60_000;

/** Counts failed attempts of the last minute: whoever guesses must wait, whoever mistypes hardly notices. */
export class Attempts {
  private readonly failures = new Map<string, number[]>();

  constructor(private readonly most: number) {}

  isTooMany(key: string, at: string): boolean {
    return this.recent(key, at).length >= this.most;
  }

  failed(key: string, at: string): void {
    // what is older than a minute says nothing any more, and must not fill the memory
    for (const known of this.failures.keys()) if (this.recent(known, at).length === 0) this.failures.delete(known);
    this.failures.set(key, [...this.recent(key, at), Date.parse(at)]);
  }

  private recent(key: string, at: string): number[] {
    return (this.failures.get(key) ?? []).filter((time) => time > Date.parse(at) - minute);
  }
}
