import { Quantity } from "@/components/ui/quantity";
import { type PlotPoint, pointName } from "./plot-points";

/** The values of the point under the pointer or the focus. */
export function PlotReadout({ point }: { point: PlotPoint | null }) {
  if (!point) return <p className="text-ink-soft text-small">No points yet.</p>;
  return (
    <p aria-live="polite" className="flex flex-wrap gap-x-4 gap-y-1 rounded border border-ink-line bg-sailcloth px-3 py-2 text-small">
      <strong className="first-letter:uppercase">{pointName(point)}</strong>
      <span>
        moment <Quantity value={point.moment} unit="t·m" decimals={2} signed />
      </span>
      <span>
        tangent <Quantity value={point.tangent} unit="mm per m" decimals={2} signed />
      </span>
      <span>
        left over <Quantity value={point.residual} unit="mm per m" decimals={3} signed />
      </span>
      {point.leftOut ? <span className="font-bold text-redlead-text">Left out: {point.leftOut}</span> : null}
    </p>
  );
}
