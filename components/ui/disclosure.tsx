import type { ReactNode } from "react";

/** What is there for whoever asks, folded away for everybody else. */
export function Disclosure({ title, children, open = false }: { title: ReactNode; children: ReactNode; open?: boolean }) {
  return (
    <details open={open} className="group">
      <summary className="flex min-h-tap list-none items-center gap-2 font-bold text-small underline decoration-ink-line underline-offset-4 hover:decoration-ink">
        <span aria-hidden="true" className="inline-block w-3 transition-transform group-open:rotate-90">
          ▸
        </span>
        {title}
      </summary>
      <div className="pt-2">{children}</div>
    </details>
  );
}
