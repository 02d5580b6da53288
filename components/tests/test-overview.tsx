import Link from "next/link";
import { Notice } from "@/components/ui/notice";
import { PageTitle } from "@/components/ui/page-title";
import { placesFor, rolesInWords, stateInWords } from "./test-state";
import type { TestLine } from "./tests-table";

/** One test: what it is, where it stands, and the places a person may go. */
export function TestOverview({ test }: { test: TestLine }) {
  const places = placesFor(test.roles);
  return (
    <>
      <PageTitle title={test.title} over={test.vessel} />
      <dl className="mb-6 grid max-w-hand grid-cols-[auto_1fr] gap-x-6 gap-y-1">
        <Fact term="Date">{test.date}</Fact>
        <Fact term="Place">{test.place}</Fact>
        <Fact term="State">{stateInWords[test.state]}</Fact>
        <Fact term="Your part">{rolesInWords(test.roles)}</Fact>
      </dl>
      {places.length === 0 ? <OnlyReads /> : null}
      <nav aria-label="Places of this test" className="grid gap-3 sm:grid-cols-2 lg:grid-cols-3">
        {places.map(({ href, title, what }) => (
          <Link
            key={href}
            href={`/tests/${test.id}/${href}`}
            prefetch={false}
            className="flex min-h-key flex-col justify-center rounded border-2 border-ink bg-sailcloth-raised px-4 py-3 hover:bg-sailcloth-sunken"
          >
            <span className="font-bold text-large">{title}</span>
            <span className="text-ink-soft text-small">{what}</span>
          </Link>
        ))}
      </nav>
    </>
  );
}

function OnlyReads() {
  return (
    <Notice title="You read at this test">
      Readings are taken on an enrolled phone: ask the lead for a code, then open <Link href="/join">the page to join</Link> on it.
    </Notice>
  );
}

function Fact({ term, children }: { term: string; children: string }) {
  return (
    <>
      <dt className="text-ink-soft">{term}</dt>
      <dd className="font-bold">{children}</dd>
    </>
  );
}
