import { forbidden, notFound, redirect } from "next/navigation";
import { database } from "@/db/server/connection";
import { isRoleHeldAnywhere, rolesOf } from "@/db/server/role-grants";
import type { Person } from "@/db/server/sessions";
import { type Test, testById } from "@/db/server/tests";
import type { Role } from "@/lib/sync/job-sheet";
import { personOf, signedInPerson } from "./session";

/** Everybody but the readers, who must not see each other's numbers. */
export const allButReaders: readonly Role[] = ["lead", "engineer", "witness", "administrator"];
export const everybody: readonly Role[] = ["reader", ...allButReaders];

export type Access = { readonly person: Person; readonly test: Test; readonly roles: readonly Role[] };

/** The person who looks at a page; nobody is led to the sign-in page and back to `here`. */
export async function requirePerson(here: string): Promise<Person> {
  return (await signedInPerson()) ?? redirect(`/sign-in?next=${encodeURIComponent(here)}`);
}

/** A person of the office (engineer or administrator): may make vessels and tests. */
export async function requireOffice(here: string): Promise<Person> {
  const person = await requirePerson(here);
  return isOffice(person) ? person : forbidden();
}

export async function requireAdministrator(here: string): Promise<Person> {
  const person = await requirePerson(here);
  return person.isAdministrator ? person : forbidden();
}

/** The person, the test and the roles held in it, for a page of the test; others get the page that refuses. */
export async function requireRole(test: string, roles: readonly Role[], here: string): Promise<Access> {
  const access = accessOf(await requirePerson(here), test, roles);
  if (access === "unknown") notFound();
  return access === "refused" ? forbidden() : access;
}

/** The sender of a request, or the answer that refuses it. */
export async function personOrRefusal(request: Request): Promise<Person | Response> {
  return (await personOf(request)) ?? refused(401, "Sign in first.");
}

/** The sender of a request, who must be an administrator, or the answer that refuses it. */
export async function administratorOrRefusal(request: Request): Promise<Person | Response> {
  const person = await personOrRefusal(request);
  if (person instanceof Response || person.isAdministrator) return person;
  return refused(403, "Accounts are the administrator's business.");
}

/** The sender and the test of a request, or the answer that refuses it. */
export async function accessOrRefusal(request: Request, test: string, roles: readonly Role[]): Promise<Access | Response> {
  const person = await personOrRefusal(request);
  if (person instanceof Response) return person;
  const access = accessOf(person, test, roles);
  if (access === "unknown") return refused(404, "There is no such test here.");
  return access === "refused" ? refused(403, "You have no part in this test that allows it.") : access;
}

/** Every refusal of a route handler has this shape. */
export function refused(status: number, error: string, more: Record<string, unknown> = {}): Response {
  return Response.json({ error, ...more }, { status, headers: { "cache-control": "no-store" } });
}

export function isOffice(person: Person): boolean {
  return person.isEngineer || person.isAdministrator;
}

/** Whoever answers for the readings: the office, and the lead of any test here. */
export function mayBackUp(person: Person): boolean {
  return isOffice(person) || isRoleHeldAnywhere(database(), person.id, ["lead", "engineer"], new Date().toISOString());
}

// whoever has no part in a test does not learn whether it exists
function accessOf(person: Person, id: string, allowed: readonly Role[]): Access | "refused" | "unknown" {
  const roles = rolesOf(database(), person.id, id, new Date().toISOString());
  if (!roles.some((role) => allowed.includes(role))) return "refused";
  const test = testById(database(), id);
  return test ? { person, test, roles } : "unknown";
}
