import Link from "next/link";
import type { ReactNode } from "react";
import { buttonClass } from "./button";
import { Notice } from "./notice";
import { PageHeader } from "./page-header";
import { PageTitle } from "./page-title";

/** A page that can't be shown, in words, with the ways on. */
export function LostPage({ title, children }: { title: string; children: ReactNode }) {
  return (
    <>
      <PageHeader home="/" />
      <main id="main" className="mx-auto max-w-hand px-4 py-8">
        <PageTitle title={title} />
        <Notice>{children}</Notice>
        <p className="mt-4 flex flex-wrap gap-3">
          <Link href="/tests" prefetch={false} className={buttonClass("plain")}>
            Your tests
          </Link>
          <Link href="/" prefetch={false} className={buttonClass("quiet")}>
            Start
          </Link>
        </p>
      </main>
    </>
  );
}
