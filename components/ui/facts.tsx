import { Fragment, type ReactNode } from "react";

/** Terms with their values, a line each. */
export function Facts({ facts }: { facts: readonly (readonly [term: string, value: ReactNode])[] }) {
  return (
    <dl className="grid grid-cols-[auto_1fr] gap-x-6 gap-y-1">
      {facts.map(([term, value]) => (
        <Fragment key={term}>
          <dt className="text-ink-soft">{term}</dt>
          <dd className="font-bold">{value}</dd>
        </Fragment>
      ))}
    </dl>
  );
}
