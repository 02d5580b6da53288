import Link from "next/link";
import type { ReactNode } from "react";
import { LightSwitch } from "./light-switch";
import { Wordmark } from "./wordmark";

/** The top of every page: the name, whoever is signed in, the light. */
export function PageHeader({ home, children }: { home: string; children?: ReactNode }) {
  return (
    <header className="border-ink-line border-b bg-sailcloth-raised">
      <a
        href="#main"
        className="sr-only focus:not-sr-only focus:absolute focus:top-2 focus:left-2 focus:z-10 focus:bg-sailcloth-raised focus:p-2"
      >
        To the content
      </a>
      <div className="mx-auto flex max-w-page flex-wrap items-center justify-between gap-x-4 gap-y-1 px-4 py-2">
        <Link href={home} prefetch={false} className="inline-flex min-h-tap items-center text-large">
          <Wordmark />
        </Link>
        <div className="flex flex-wrap items-center gap-3">
          {children}
          <LightSwitch compact />
        </div>
      </div>
    </header>
  );
}
