import Link from "next/link";
import { buttonClass } from "@/components/ui/button";
import { Wordmark } from "@/components/ui/wordmark";

/** Shown for every page that needs the server while the server is silent. */
export function OfflinePage() {
  return (
    <main id="main" className="mx-auto flex min-h-dvh max-w-hand flex-col gap-4 px-4 py-6">
      <Wordmark className="text-large" />
      <h1 className="mt-6 font-bold text-title">This page needs the server, and the server does not answer</h1>
      <p className="text-large">
        Readings go on without it: they are saved on this phone and sent by themselves when the server is heard again.
      </p>
      <Link href="/readings" className={`${buttonClass("now")} mt-auto min-h-16 w-full !text-title`}>
        To the readings
      </Link>
    </main>
  );
}
