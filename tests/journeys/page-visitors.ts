import type { Role } from "@/lib/sync/job-sheet";

/** Who opens a page in the journeys: the person it was made for; null where nobody need be signed in. First match counts. */
const visitors: readonly { readonly routes: RegExp; readonly visitor: Role | null }[] = [
  { routes: /^\/(sign-in|join|password|offline)?$/, visitor: null },
  { routes: /^\/readings(\/|$)/, visitor: null },
  { routes: /^\/people(\/|$)/, visitor: "administrator" },
  { routes: /^\/tests\/\[[a-z]+\]\/control$/, visitor: "lead" },
  { routes: /^\/tests\/\[[a-z]+\]\/ledger$/, visitor: "witness" },
  { routes: /^\/(tests|vessels)(\/|$)/, visitor: "engineer" },
];

export function visitorOf(route: string): Role | null {
  const row = visitors.find(({ routes }) => routes.test(route));
  if (!row) throw new Error(`who opens ${route}? page-visitors.ts does not say`);
  return row.visitor;
}
