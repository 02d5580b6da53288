import type { Role, TestState } from "@/lib/sync/job-sheet";

/** What a test's state means for whoever reads the list. */
export const stateInWords: Record<TestState, string> = {
  planning: "planning",
  open: "open: readings are being taken",
  closed: "closed: readings are over",
  reconciled: "reconciled",
  issued: "report issued",
};

export function rolesInWords(roles: readonly Role[]): string {
  return roles.length === 0 ? "none" : roles.join(", ");
}

/** Where a person may go in a test, by role. */
export function placesFor(roles: readonly Role[]): { readonly href: string; readonly title: string; readonly what: string }[] {
  const sees = (...allowed: Role[]) => roles.some((role) => allowed.includes(role));
  const plan = { href: "plan", title: "Plan", what: "Stations, weights, and what each move should show" };
  const control = { href: "control", title: "Central control", what: "Moves, readings as they arrive, the line" };
  const reconcile = { href: "reconcile", title: "Reconcile", what: "Every reading due beside what was read; decisions; the test's state" };
  const lightship = { href: "lightship", title: "Lightship", what: "From as inclined to lightship; the record file" };
  const ledger = { href: "ledger", title: "Ledger", what: "Who did what and when, and whether it still fits" };
  return [
    ...(sees("lead", "engineer") ? [plan] : []),
    ...(sees("lead", "engineer", "administrator", "witness") ? [control] : []),
    ...(sees("lead", "engineer") ? [reconcile] : []),
    ...(sees("lead", "engineer", "witness") ? [lightship] : []),
    ...(sees("lead", "engineer", "administrator", "witness") ? [ledger] : []),
  ];
}
