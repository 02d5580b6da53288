import type { ReactNode, TdHTMLAttributes, ThHTMLAttributes } from "react";

type DataTableProps = { caption: string; children: ReactNode; showCaption?: boolean; className?: string };

/** A table with its caption; wide ones scroll by themselves and never push the page. */
export function DataTable({ caption, children, showCaption = false, className = "" }: DataTableProps) {
  return (
    <section aria-label={caption} className="relative overflow-x-auto">
      <table className={`w-full border-collapse text-left text-base ${className}`}>
        <caption className={showCaption ? "pb-2 text-left font-bold text-small" : "sr-only"}>{caption}</caption>
        {children}
      </table>
    </section>
  );
}

type Align = { figure?: boolean };

export function ColumnHead({ figure, className = "", ...rest }: ThHTMLAttributes<HTMLTableCellElement> & Align) {
  return (
    <th
      scope="col"
      className={`border-ink-line border-b-2 px-2 py-1.5 align-bottom font-bold text-small ${figure ? "text-right" : ""} ${className}`}
      {...rest}
    />
  );
}

export function RowHead({ className = "", ...rest }: ThHTMLAttributes<HTMLTableCellElement>) {
  return <th scope="row" className={`border-ink-line border-b px-2 py-1.5 font-bold ${className}`} {...rest} />;
}

export function Cell({ figure, className = "", ...rest }: TdHTMLAttributes<HTMLTableCellElement> & Align) {
  return (
    <td
      className={`border-ink-line border-b px-2 py-1.5 ${figure ? "whitespace-nowrap text-right tabular-nums" : ""} ${className}`}
      {...rest}
    />
  );
}
