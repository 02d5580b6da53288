import type { NextAuthOptions } from "next-auth";
import Credentials from "next-auth/providers/credentials";
import { database } from "@/db/server/connection";
import { sessionSecret } from "@/db/server/secrets";
import { standingPerson } from "@/db/server/sessions";
import { type SignedIn, sessionOfAccount, sessionOfDevice, sessionOfEnrolment } from "@/db/server/sign-in";

const days = 24 * 60 * 60;

/** How people sign in: with e-mail and password, or a phone with its code. Made per request: the build has neither secret nor database. */
export function authOptions(): NextAuthOptions {
  return {
    secret: sessionSecret(),
    session: { strategy: "jwt", maxAge: 30 * days },
    pages: { signIn: "/sign-in", error: "/sign-in" },
    providers: [
      Credentials({
        id: "credentials",
        name: "password",
        credentials: { email: {}, password: {} },
        authorize: (given) => sessionOfAccount(database(), given, now()),
      }),
      Credentials({
        id: "enrolment",
        name: "enrolment",
        credentials: { code: {}, device: {}, deviceName: {}, publicKey: {} },
        authorize: async (given) => sessionOfEnrolment(database(), given, now()),
      }),
      Credentials({
        id: "device",
        name: "device",
        credentials: { device: {}, signature: {} },
        authorize: async (given) => sessionOfDevice(database(), given, now()),
      }),
    ],
    callbacks: {
      jwt: ({ token, user }) => (isSignedIn(user) ? { ...token, ...user.seal } : token),
      session: ({ session, token }) => ({ ...session, user: shownTo(standingPerson(database(), token, now())) }),
    },
  };
}

function shownTo(person: ReturnType<typeof standingPerson>) {
  return person ? { id: person.id, name: person.name } : undefined;
}

// the library calls back with the user at sign-in, later without
function isSignedIn(user: object | undefined): user is SignedIn {
  return user !== undefined && "seal" in user;
}

function now(): string {
  return new Date().toISOString();
}
