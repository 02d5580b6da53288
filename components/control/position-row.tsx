import type { UseFormReturn } from "react-hook-form";
import { QuantityField } from "@/components/ui/quantity-field";
import type { PositionsRead, PositionsTyped } from "./positions-form";

const axes = [
  { axis: "x", label: "from AP" },
  { axis: "y", label: "to starb." },
  { axis: "z", label: "above base" },
] as const;

/** One weight's centre: x, y, z. */
export function PositionRow({
  id,
  weight,
  index,
  form,
}: {
  id: string;
  weight: string;
  index: number;
  form: UseFormReturn<PositionsTyped, unknown, PositionsRead>;
}) {
  const errors = form.formState.errors.rows?.[index];
  return (
    <fieldset className="grid grid-cols-3 items-end gap-2">
      <legend className="mb-1 font-bold text-small">Weight {weight}</legend>
      {axes.map(({ axis, label }) => (
        <QuantityField
          key={axis}
          id={`${id}-${axis}`}
          label={`${axis}, ${label}`}
          unit="m"
          error={errors?.[axis]?.message}
          {...form.register(`rows.${index}.${axis}`)}
        />
      ))}
    </fieldset>
  );
}
