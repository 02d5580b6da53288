/** Who changes something and when; the clock is given, so that a test or the demo can say what time it is. */
export type Act = {
  /** account; null: the server itself, or somebody not yet signed in */
  readonly by: string | null;
  readonly at: string;
  readonly device?: string | null;
  readonly reason?: string | null;
};
