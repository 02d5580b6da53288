import Link from "next/link";
import { PageHeader } from "@/components/ui/page-header";
import { PageTitle } from "@/components/ui/page-title";
import { pathWithin } from "./path-within";
import { SignInForm } from "./sign-in-form";

/** The way in for whoever has an account; a phone comes in by its code. */
export function SignInPage({ next }: { next: string | null }) {
  return (
    <>
      <PageHeader home="/" />
      <main id="main" className="mx-auto max-w-hand px-4 py-8">
        <PageTitle title="Sign in" over="Lead, engineer, witness, administrator" />
        <SignInForm next={pathWithin(next)} />
        <p className="mt-6 text-small">
          A phone for the readings comes in with a code:{" "}
          <Link href="/join" prefetch={false} className="inline-flex min-h-tap items-center underline underline-offset-4">
            join with a code
          </Link>
          . A password that was forgotten:{" "}
          <Link href="/password" prefetch={false} className="inline-flex min-h-tap items-center underline underline-offset-4">
            set a new one
          </Link>
        </p>
      </main>
    </>
  );
}
