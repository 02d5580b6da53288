import { BattenStrip } from "@/components/batten/batten-strip";
import { restingPoint } from "@/lib/inclining/resting-point";
import { promised } from "@/lib/result";

const swing = [112, 88, 110.5, 89.5, 109];
const rest = promised(restingPoint("turning-points", swing)).value;

/** What a reading is, shown rather than told: five turning points, their resting point, the zero. */
export function StartBatten() {
  const marks = swing.map((value, index) => ({ value, label: String(index + 1) }));
  return (
    <figure className="max-w-2xl">
      <BattenStrip unit="mm" marks={marks} mean={rest} zero={0} span={[-40, 160]} />
      <figcaption className="text-ink-soft text-small">
        A bob swings over its batten; five turning points give the place where it would rest.
      </figcaption>
    </figure>
  );
}
