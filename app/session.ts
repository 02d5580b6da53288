import { cookies } from "next/headers";
import { decode } from "next-auth/jwt";
import { database } from "@/db/server/connection";
import { sessionSecret } from "@/db/server/secrets";
import { type Person, standingPerson } from "@/db/server/sessions";

/** As the session library names its cookie over https and over http. */
const cookieNames = ["__Secure-next-auth.session-token", "next-auth.session-token"];

/** Who is signed in, for a page; null: nobody. */
export async function signedInPerson(): Promise<Person | null> {
  const jar = await cookies();
  return personOfCookies((name) => jar.get(name)?.value);
}

/** Who sends a request, for a route handler; null: nobody. */
export async function personOf(request: Request): Promise<Person | null> {
  const jar = new Map(pairsOf(request.headers.get("cookie") ?? ""));
  return personOfCookies((name) => jar.get(name));
}

async function personOfCookies(cookieOf: (name: string) => string | undefined): Promise<Person | null> {
  const token = cookieNames.map(cookieOf).find((value) => value !== undefined && value !== "");
  if (token === undefined) return null;
  const seal = await decode({ token, secret: sessionSecret() }).catch(() => null);
  return standingPerson(database(), seal, new Date().toISOString());
}

function pairsOf(header: string): [string, string][] {
  return header.split(/; */).map((pair) => {
    const [name = "", ...value] = pair.split("=");
    return [name, value.join("=")];
  });
}
