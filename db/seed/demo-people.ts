import { type Account, createAccount } from "@/db/server/accounts";
import type { Database } from "@/db/server/connection";
import { grantRole } from "@/db/server/role-grants";
import { promised } from "@/lib/result";
import type { Role } from "@/lib/sync/job-sheet";

/** Everybody of the demo is invented, and signs in with this password. */
export const demoPassword = "batten-and-bob";

export type DemoPerson = { readonly id: string; readonly role: Role; readonly name: string; readonly email: string };

function person(no: number, role: Role, name: string, email: string): DemoPerson {
  return { id: `5ce44715-0000-4000-8000-${String(100 + no).padStart(12, "0")}`, role, name, email };
}

export const demoPeople = {
  engineer: person(1, "engineer", "Tomas Veen", "tomas@skerry.example"),
  lead: person(2, "lead", "Ragna Holt", "ragna@skerry.example"),
  witness: person(3, "witness", "Iris Calder", "iris@skerry.example"),
  administrator: person(4, "administrator", "Odd Brandal", "odd@skerry.example"),
  mara: person(5, "reader", "Mara Quist", "mara@skerry.example"),
  nils: person(6, "reader", "Nils Aker", "nils@skerry.example"),
} as const;

export function createDemoPeople(db: Database, passwordHash: string, at: string): Account[] {
  return Object.values(demoPeople).map(({ id, role, name, email }) => {
    const is = { isAdministrator: role === "administrator", isEngineer: role === "engineer" };
    return promised(createAccount(db, { id, name, email, passwordHash, ...is }, { by: null, at }));
  });
}

/** Everybody has his part in the test; the administrator has one in every test anyway. */
export function giveDemoRoles(db: Database, test: string, at: string): void {
  for (const { id, role } of Object.values(demoPeople)) {
    if (role !== "administrator") grantRole(db, { test, account: id, role }, { by: demoPeople.engineer.id, at });
  }
}
