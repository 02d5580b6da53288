import Link from "next/link";
import type { ReactNode } from "react";
import { PageHeader } from "./page-header";
import { SignOut } from "./sign-out";

/** What surrounds the pages of wheelhouse and office: the name, the tests, who is signed in. */
export function OfficeShell({ person, children }: { person: { name: string; isAdministrator: boolean } | null; children: ReactNode }) {
  return (
    <>
      <PageHeader home="/">
        <nav aria-label="Places" className="flex gap-4">
          <Place href="/tests">Tests</Place>
          {person?.isAdministrator ? <Place href="/people">People</Place> : null}
        </nav>
        {person ? <span className="hidden text-small sm:inline">{person.name}</span> : null}
        {person ? <SignOut /> : null}
      </PageHeader>
      <main id="main" className="mx-auto max-w-page px-4 py-5">
        {children}
      </main>
    </>
  );
}

function Place({ href, children }: { href: string; children: ReactNode }) {
  return (
    <Link
      href={href}
      prefetch={false}
      className="inline-flex min-h-tap items-center underline decoration-ink-line underline-offset-4 hover:decoration-ink"
    >
      {children}
    </Link>
  );
}
