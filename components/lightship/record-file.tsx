import Link from "next/link";
import { buttonClass } from "@/components/ui/button";
import { Panel } from "@/components/ui/panel";

/** The whole test in one open file, for another office, or for ten years from now. */
export function RecordFile({ test }: { test: string }) {
  return (
    <Panel title="Record file" className="mt-5">
      <p className="max-w-prose">
        One open file holds the plan, every reading and every decision; whoever reads it gets the same digits. Each export stands in the
        ledger. A file from another server is read in under{" "}
        <Link href="/tests" prefetch={false} className="underline underline-offset-4">
          Tests
        </Link>
        .
      </p>
      <p className="mt-3">
        <a href={`/api/v1/tests/${test}/record`} download className={buttonClass("plain")}>
          Export the record
        </a>
      </p>
    </Panel>
  );
}
