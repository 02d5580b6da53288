import Link from "next/link";
import type { ReactNode } from "react";
import { buttonClass } from "./button";
import { Notice } from "./notice";
import { PageTitle } from "./page-title";

/** Why a page can't be shown, in words, with the ways on. */
export function LostWords({ title, children }: { title: string; children: ReactNode }) {
  return (
    <div className="max-w-hand">
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
    </div>
  );
}
