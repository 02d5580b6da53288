import type { UseFormReturn } from "react-hook-form";
import { QuantityField } from "@/components/ui/quantity-field";
import type { EntryKind, RadioReading, RadioTyped } from "./radio-entry";

type Form = UseFormReturn<RadioTyped, unknown, RadioReading>;

/** The fields that a reading's kind asks for, each with its unit. */
export function RadioValueFields({ kind, form }: { kind: EntryKind; form: Form }) {
  if (kind === "legs") return <Legs form={form} />;
  const swings = kind === "swing" || kind === "angle";
  return (
    <>
      <QuantityField
        id="radio-value"
        label={swings ? "Value, or turning points in order" : "Value"}
        unit={unitOf[kind]}
        error={form.formState.errors.value?.message}
        {...form.register("value")}
      />
      {swings ? <Mode form={form} /> : null}
    </>
  );
}

const unitOf: Record<Exclude<EntryKind, "legs">, string> = { swing: "mm", angle: "°", metres: "m", density: "t/m³" };

function Legs({ form }: { form: Form }) {
  const { errors } = form.formState;
  return (
    <div className="grid grid-cols-2 gap-3">
      <QuantityField id="radio-port" label="Port leg" unit="mm" error={errors.port?.message} {...form.register("port")} />
      <QuantityField
        id="radio-starboard"
        label="Starboard leg"
        unit="mm"
        error={errors.starboard?.message}
        {...form.register("starboard")}
      />
    </div>
  );
}

function Mode({ form }: { form: Form }) {
  return (
    <fieldset className="flex flex-wrap gap-x-5">
      <legend className="sr-only">How the bob was read</legend>
      <label className="flex min-h-tap items-center gap-2">
        <input type="radio" value="settled" className="h-5 w-5 accent-redlead" {...form.register("mode")} />
        Settled
      </label>
      <label className="flex min-h-tap items-center gap-2">
        <input type="radio" value="turning-points" className="h-5 w-5 accent-redlead" {...form.register("mode")} />
        Turning points of a swing
      </label>
    </fieldset>
  );
}
