import { decimalsFor, figure, signedFigure } from "@/lib/report/rounding";

type Digits = { uncertainty: number; decimals?: never } | { decimals: number; uncertainty?: never };
export type QuantityProps = Digits & {
  /** null where it is not known: shown as a dash, said as words */
  value: number | null;
  unit: string;
  /** residuals, trim and heel always show their sign */
  signed?: boolean;
  className?: string;
};

/** The one way out for a number: its digits follow the uncertainty, its unit stands beside it. */
export function Quantity({ value, unit, signed = false, className = "", ...digits }: QuantityProps) {
  if (value === null) return <Unknown className={className} />;
  return (
    <span className={`whitespace-nowrap tabular-nums ${className}`}>
      {quantityFigure(value, digits, signed)}
      <Unit unit={unit} />
    </span>
  );
}

function quantityFigure(value: number, { decimals, uncertainty }: Digits, signed: boolean): string {
  const places = decimals ?? decimalsFor(uncertainty ?? 0);
  return signed ? signedFigure(value, places) : figure(value, places);
}

// a degree sign stands at its figure, other units a space away
function Unit({ unit }: { unit: string }) {
  if (unit === "" || unit === "°") return unit;
  return <span className="text-[0.85em]"> {unit}</span>;
}

function Unknown({ className }: { className: string }) {
  return (
    <span className={className}>
      <span aria-hidden="true">–</span>
      <span className="sr-only">not known</span>
    </span>
  );
}
