"use client";

import { zodResolver } from "@hookform/resolvers/zod";
import { useId } from "react";
import { useForm } from "react-hook-form";
import { z } from "zod";
import { Button } from "@/components/ui/button";
import { numberSchema } from "@/components/ui/number-schema";
import type { TestRecord } from "@/lib/record/test-record";
import type { ReadingDue } from "@/lib/sync/live";
import { PositionRow } from "./position-row";

type Place = [number, number, number];
export type Measured = { readonly weight: string; readonly place: Place };
type PositionsFormProps = {
  move: number;
  /** where the plan puts each weight at this move */
  planned: TestRecord["moves"][number]["positions"];
  /** this move's position slots that nobody has filled yet */
  due: readonly ReadingDue[];
  onMeasured: (measured: readonly Measured[]) => Promise<void>;
};

const rowSchema = z.object({ weight: z.string(), x: numberSchema(), y: numberSchema(), z: numberSchema() });
const schema = z.object({
  rows: z.array(rowSchema),
  measured: z.boolean().refine((confirmed) => confirmed, "Measure the weights where they stand, then confirm it here."),
});
export type PositionsTyped = z.input<typeof schema>;
export type PositionsRead = z.output<typeof schema>;

/** Where the weights really stand at a move: the plan's places stand in the fields, and a person answers for them. */
export function PositionsForm({ move, planned, due, onMeasured }: PositionsFormProps) {
  const id = useId();
  const weights = due.flatMap(({ slot }) => (slot.kind === "position" ? [slot.weight] : []));
  const form = useForm<PositionsTyped, unknown, PositionsRead>({
    resolver: zodResolver(schema),
    defaultValues: { rows: weights.map((weight) => typedRow(weight, planned[weight])), measured: false },
  });
  const save = form.handleSubmit(({ rows }) => onMeasured(rows.map(({ weight, x, y, z }) => ({ weight, place: [x, y, z] }))));
  const wrong = form.formState.errors.measured?.message;
  return (
    <form onSubmit={save} noValidate className="flex flex-col gap-3" aria-label={`Positions of the weights at move ${move}`}>
      {weights.map((weight, index) => (
        <PositionRow key={weight} id={`${id}-${weight}`} weight={weight} index={index} form={form} />
      ))}
      <label className="flex min-h-tap items-center gap-3">
        <input
          type="checkbox"
          className="h-6 w-6 accent-redlead"
          aria-describedby={wrong ? `${id}-measured` : undefined}
          {...form.register("measured")}
        />
        Measured where they stand at move {move}, not taken from the plan
      </label>
      {wrong ? (
        <p id={`${id}-measured`} role="alert" className="text-redlead-text text-small">
          {wrong}
        </p>
      ) : null}
      <div>
        <Button type="submit">Save positions</Button>
      </div>
    </form>
  );
}

function typedRow(weight: string, place: readonly number[] | undefined) {
  const [x = "", y = "", z = ""] = place ?? [];
  return { weight, x: String(x), y: String(y), z: String(z) };
}
