import Link from "next/link";
import type { ReactNode } from "react";
import { buttonClass } from "./button";
import { Notice } from "./notice";
import { PageTitle } from "./page-title";

/** A page that this person may not see, in words, with the way back. */
export function Refused({ title, children, back = "/tests" }: { title: string; children: ReactNode; back?: string }) {
  return (
    <div className="max-w-hand">
      <PageTitle title={title} />
      <Notice tone="caution">{children}</Notice>
      <p className="mt-4">
        <Link href={back} prefetch={false} className={buttonClass("plain")}>
          Back
        </Link>
      </p>
    </div>
  );
}
