import { BattenStrip } from "@/components/batten/batten-strip";
import { typedNumber } from "@/components/ui/typed-number";
import type { OwnReading } from "../task/use-own-readings";
import { type BattenEntry, type Leg, legValues, restOf, type Station } from "./batten-entry";
import { restAtZero } from "./earlier-rests";
import { LegGauges } from "./leg-gauges";
import { stripSpan } from "./strip-span";

type BattenHeroProps = { form: BattenEntry; station: Station; unit: "mm" | "°"; own: readonly OwnReading[]; onLeg: (leg: Leg) => void };

/** What is being read, drawn where it stands: the batten from above, or the two legs of a U-tube. */
export function BattenHero({ form, station, unit, own, onLeg }: BattenHeroProps) {
  if (station.instrument === "u-tube") return <LegGauges form={form} scale={station.scale} onLeg={onLeg} />;
  const values = legValues(form, "whole").filter((value) => value >= station.scale[0] && value <= station.scale[1]);
  const marks = values.map((value, index) => ({ value, label: String(index + 1) }));
  const zero = restAtZero(own, station);
  const taken = form.marks.whole.map(typedNumber).filter((value) => value !== null);
  return (
    <BattenStrip
      unit={unit}
      marks={marks}
      mean={values.length > 0 ? restOf(form, "whole") : null}
      zero={zero}
      span={stripSpan(station.scale, taken, values)}
    />
  );
}
