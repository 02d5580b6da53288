import { figure } from "@/lib/report/rounding";

type MarkBoardProps = { estimates: readonly number[]; mean: number | null; kind: "draft" | "freeboard" };

const WIDTH = 336;
const HEIGHT = 118;
const HALF_SPAN = 0.3;

/** The plating with its marks as the boat sees it: each estimate a line, the mean the waterline. */
export function MarkBoard({ estimates, mean, kind }: MarkBoardProps) {
  const middle = mean ?? 0.5;
  // a freeboard is read downwards from the deck edge
  const down = kind === "draft" ? -1 : 1;
  const yOf = (value: number) => HEIGHT / 2 + (down * (value - middle) * HEIGHT) / (2 * HALF_SPAN);
  const first = Math.ceil((middle - HALF_SPAN) * 10);
  const marks = Array.from({ length: Math.floor((middle + HALF_SPAN) * 10) - first + 1 }, (_, i) => (first + i) / 10);
  return (
    <svg
      viewBox={`0 0 ${WIDTH} ${HEIGHT}`}
      role="img"
      aria-label={inWords(estimates, mean)}
      className="block w-full overflow-hidden rounded"
    >
      <rect width={WIDTH} height={HEIGHT} className="fill-sailcloth-sunken" />
      {mean === null ? null : <rect y={HEIGHT / 2} width={WIDTH} height={HEIGHT / 2} className="fill-ink opacity-10" />}
      {marks.map((mark) => (
        <g key={mark} className={mean === null ? "opacity-40" : ""}>
          <line x1="84" x2="112" y1={yOf(mark)} y2={yOf(mark)} className="stroke-ink" strokeWidth="2" />
          <text x="76" y={yOf(mark) + 4} textAnchor="end" className="fill-ink text-[13px]">
            {mean === null ? "·" : figure(mark, 1)}
          </text>
        </g>
      ))}
      {estimates
        .map((value, index) => ({ no: index + 1, value }))
        .map(({ no, value }) => (
          <line key={no} x1="84" x2="196" y1={yOf(value)} y2={yOf(value)} className="stroke-ink-soft" strokeDasharray="4 3" />
        ))}
      {mean === null ? null : (
        <g>
          <line x1="0" x2={WIDTH} y1={HEIGHT / 2} y2={HEIGHT / 2} className="stroke-redlead" strokeWidth="2.5" />
          <text x={WIDTH - 10} y={HEIGHT / 2 - 8} textAnchor="end" className="fill-ink font-bold text-[22px]">
            {figure(mean, 3)} m
          </text>
          <text x={WIDTH - 10} y={HEIGHT / 2 + 18} textAnchor="end" className="fill-ink text-[12px]">
            {estimates.length > 1 ? `mean of ${estimates.length}` : "one estimate"}
          </text>
        </g>
      )}
    </svg>
  );
}

function inWords(estimates: readonly number[], mean: number | null): string {
  return mean === null ? "Marks: nothing read yet" : `Marks: waterline at ${figure(mean, 3)} m, mean of ${estimates.length}`;
}
