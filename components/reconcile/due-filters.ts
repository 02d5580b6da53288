import type { ReadingDue } from "@/lib/sync/live";

export type DueFilter = "all" | "open" | "missing" | "late" | "settled" | "changed";

export const dueFilters: readonly { readonly id: DueFilter; readonly label: string }[] = [
  { id: "all", label: "All" },
  { id: "open", label: "Disagree" },
  { id: "missing", label: "Not read" },
  { id: "late", label: "Late" },
  { id: "settled", label: "Settled" },
  { id: "changed", label: "Corrected or taken back" },
];

/** Whether a reading due is one of those that are asked for. */
export function isShown({ state, readings }: ReadingDue, filter: DueFilter): boolean {
  switch (filter) {
    case "all":
      return true;
    case "open":
      return state === "disagrees";
    case "missing":
      return state === "empty";
    case "late":
      return readings.some(({ late, capturedAfterClose }) => late || capturedAfterClose);
    case "settled":
      return state === "resolved";
    case "changed":
      return readings.some(({ status, corrected }) => corrected || status === "void");
  }
}
