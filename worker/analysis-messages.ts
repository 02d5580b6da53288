import type { Defence } from "@/lib/lightship/defended-lightship";
import type { TestRecord } from "@/lib/record/test-record";

/** What a page asks of the sums off the main thread, and what it hears. */
export type AnalysisQuestion = { readonly record: TestRecord };

export type AnalysisAnswer =
  | { readonly type: "progress"; readonly share: number }
  | { readonly type: "done"; readonly defence: Defence }
  | { readonly type: "refused" };
