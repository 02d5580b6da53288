import type { ReactNode } from "react";

type PanelProps = { title: string; id?: string; aside?: ReactNode; children: ReactNode; className?: string };

/** A titled part of a page; the title names what stands in it, the aside says its state in a few words. */
export function Panel({ title, id, aside, children, className = "" }: PanelProps) {
  const heading = id ?? title.toLowerCase().replaceAll(/[^a-z]+/g, "-");
  return (
    <section aria-labelledby={heading} className={`min-w-0 rounded border border-ink-line bg-sailcloth-raised ${className}`}>
      <header className="flex flex-wrap items-baseline justify-between gap-x-4 gap-y-1 border-ink-line border-b px-4 py-2">
        <h2 id={heading} className="font-bold text-base">
          {title}
        </h2>
        {aside ? <div className="text-ink-soft text-small">{aside}</div> : null}
      </header>
      <div className="p-4">{children}</div>
    </section>
  );
}
