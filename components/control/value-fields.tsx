import type { UseFormRegisterReturn } from "react-hook-form";
import { QuantityField } from "@/components/ui/quantity-field";
import type { EntryKind } from "./radio-entry";

type Name = "value" | "port" | "starboard";
type ValueFieldsProps = {
  id: string;
  kind: EntryKind;
  errors: Partial<Record<Name, { message?: string }>>;
  register: (name: Name) => UseFormRegisterReturn;
};

/** The fields that a reading's kind asks for, each with its unit. */
export function ValueFields({ id, kind, errors, register }: ValueFieldsProps) {
  if (kind !== "legs") {
    const label = kind === "swing" || kind === "angle" ? "Value, or turning points in order" : "Value";
    return <QuantityField id={`${id}-value`} label={label} unit={unitOf[kind]} error={errors.value?.message} {...register("value")} />;
  }
  return (
    <div className="grid grid-cols-2 gap-3">
      <QuantityField id={`${id}-port`} label="Port leg" unit="mm" error={errors.port?.message} {...register("port")} />
      <QuantityField id={`${id}-starboard`} label="Starboard leg" unit="mm" error={errors.starboard?.message} {...register("starboard")} />
    </div>
  );
}

const unitOf: Record<Exclude<EntryKind, "legs">, string> = { swing: "mm", angle: "°", metres: "m", density: "t/m³" };
