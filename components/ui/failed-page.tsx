"use client";

import { Button } from "./button";
import { Notice } from "./notice";
import { PageTitle } from "./page-title";

/** When a page broke: nothing saved is lost, and trying again is one tap away. */
export function FailedPage({ error, reset }: { error: Error & { digest?: string }; reset: () => void }) {
  return (
    <main id="main" className="mx-auto max-w-hand px-4 py-8">
      <PageTitle title="This page could not be shown" />
      <Notice tone="refused">
        Something failed while the page was made. What was saved on this device or on the server is still there.
        {error.digest ? ` The server’s log has it under ${error.digest}.` : ""}
      </Notice>
      <p className="mt-4">
        <Button weight="now" onClick={reset}>
          Try again
        </Button>
      </p>
    </main>
  );
}
