import type { BrowserContext } from "@playwright/test";
import type { Role } from "@/lib/sync/job-sheet";
import { ProductServer } from "./product-server";

export type Account = { readonly email: string; readonly password: string };

/** A running server with the demo aboard, and the accounts that `npm run demo` tells a person. */
export type DemoShip = { readonly server: ProductServer; readonly accounts: ReadonlyMap<string, Account> };

export async function demoShip(url?: string): Promise<DemoShip> {
  const server = await ProductServer.make(url);
  const printed = await server.command("db/server/commands/demo.ts");
  await server.start();
  return { server, accounts: accountsIn(printed) };
}

export function accountOf(ship: DemoShip, role: Role): Account {
  const account = ship.accounts.get(role);
  if (!account) throw new Error(`the demo tells of no account for the ${role}`);
  return account;
}

/** Signs a person of this role in, as the sign-in page does. */
export async function signIn(context: BrowserContext, ship: DemoShip, role: Role): Promise<void> {
  const account = accountOf(ship, role);
  const { csrfToken } = await (await context.request.get(`${ship.server.url}/api/auth/csrf`)).json();
  const form = { csrfToken, ...account, json: "true" };
  await context.request.post(`${ship.server.url}/api/auth/callback/credentials`, { form });
  const session = await (await context.request.get(`${ship.server.url}/api/auth/session`)).json();
  if (!session?.user) throw new Error(`the ${role} could not sign in as ${account.email}`);
}

/** The address of a page of the demo: each parameter of the route becomes the first one that its list links to. */
export async function addressOf(route: string, ship: DemoShip, context: BrowserContext): Promise<string> {
  let address = "";
  for (const segment of route.split("/").slice(1)) {
    address += segment.startsWith("[") ? `/${await firstLinked(address, ship, context)}` : `/${segment}`;
  }
  return ship.server.url + address;
}

async function firstLinked(list: string, ship: DemoShip, context: BrowserContext): Promise<string> {
  const html = await (await context.request.get(ship.server.url + list)).text();
  const id = new RegExp(`href="${list}/([0-9a-f-]{36})`).exec(html)?.[1];
  if (id === undefined) throw new Error(`${list} links to none of its own`);
  return id;
}

// one line for each role: "engineer  name@yard.example  password"
function accountsIn(printed: string): ReadonlyMap<string, Account> {
  const lines = printed.matchAll(/^\s*([a-z]+)\s+(\S+@\S+)\s+(\S+)\s*$/gm);
  return new Map([...lines].map(([, role = "", email = "", password = ""]) => [role, { email, password }]));
}
