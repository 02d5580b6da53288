import type { ReactNode } from "react";

/** The one first heading of a page, with a line of context above and what belongs beside it. */
export function PageTitle({ title, over, children }: { title: string; over?: ReactNode; children?: ReactNode }) {
  return (
    <div className="mb-5 flex flex-wrap items-end justify-between gap-x-6 gap-y-2">
      <div className="min-w-0">
        {over ? <p className="text-ink-soft text-small">{over}</p> : null}
        <h1 className="text-balance font-bold text-title">{title}</h1>
      </div>
      {children}
    </div>
  );
}
