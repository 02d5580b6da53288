import type { ReactNode } from "react";
import { LostWords } from "./lost-words";
import { PageHeader } from "./page-header";

/** A page that can't be shown, where no other page surrounds it. */
export function LostPage({ title, children }: { title: string; children: ReactNode }) {
  return (
    <>
      <PageHeader home="/" />
      <main id="main" className="mx-auto max-w-page px-4 py-5">
        <LostWords title={title}>{children}</LostWords>
      </main>
    </>
  );
}
