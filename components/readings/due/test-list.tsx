import Link from "next/link";
import type { SheetHere } from "../task/use-job-sheet";

/** Several tests on one phone: pick the one that is run now. */
export function TestList({ tests }: { tests: readonly SheetHere[] }) {
  return (
    <section className="flex flex-col gap-3 py-2" aria-labelledby="tests">
      <h1 id="tests" className="font-bold text-title">
        Which test?
      </h1>
      {tests.map(({ sheet }) => (
        <Link
          key={sheet.test.id}
          href={`/readings?test=${sheet.test.id}`}
          className="flex min-h-16 flex-col justify-center rounded border-2 border-ink bg-sailcloth-raised px-4 py-2"
        >
          <span className="font-bold text-large">{sheet.vessel.name}</span>
          <span className="text-ink-soft text-small">
            {sheet.test.title} · {sheet.test.date}
          </span>
        </Link>
      ))}
    </section>
  );
}
