/** How an input may be off. */
export type Chance = {
  /** normal, where left out */
  readonly distribution?: "normal" | "rectangular";
  /** of the standard uncertainty itself, where it comes from scatter: Student's t; null: it is stated */
  readonly degreesOfFreedom: number | null;
};

/** One thing that is known only so far: by how much, and what the data would be if it were off by an amount. */
export type UncertainInput<T> = Chance & {
  /** what a person could measure better: several inputs may share it */
  readonly cause: string;
  readonly standard: number;
  readonly shifted: (given: T, by: number) => T;
};
