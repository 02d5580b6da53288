"use client";

import { zodResolver } from "@hookform/resolvers/zod";
import { useForm } from "react-hook-form";
import { Button } from "@/components/ui/button";
import { Notice } from "@/components/ui/notice";
import { QuantityField } from "@/components/ui/quantity-field";
import { type ExpectedShip, type ExpectedTyped, expectedFields, expectedSchema, typedExpected } from "./expected-typed";
import { useSaveExpected } from "./use-save-expected";

type ExpectedFormProps = { test: string; expected: ExpectedShip | undefined; mayState: boolean };

/** How the ship is thought to float on the day, with everything aboard: from an earlier lightship, a sister, or an estimate. */
export function ExpectedForm({ test, expected, mayState }: ExpectedFormProps) {
  const { save, refused } = useSaveExpected(test);
  const form = useForm<ExpectedTyped, unknown, ExpectedShip>({ resolver: zodResolver(expectedSchema), values: typedExpected(expected) });
  const { errors, isSubmitting } = form.formState;
  return (
    <form onSubmit={form.handleSubmit(save)} noValidate className="flex flex-col gap-4">
      <p className="text-small">
        With weights, people and liquids aboard as they will be. KG counts the liquids as free to move: the solid KG and the free surface
        correction together.
      </p>
      <fieldset disabled={!mayState} className="grid gap-x-6 gap-y-3 sm:grid-cols-2">
        <legend className="sr-only">The ship as she is expected</legend>
        {expectedFields.map(({ key, label, unit }) => (
          <QuantityField key={key} id={`e-${key}`} label={label} unit={unit} error={errors[key]?.message} {...form.register(key)} />
        ))}
      </fieldset>
      {refused ? <Notice tone="refused">{refused}</Notice> : null}
      {mayState ? (
        <div className="flex flex-wrap gap-3">
          <Button type="submit" weight="now" disabled={isSubmitting}>
            Predict the moves
          </Button>
          {expected ? <Button onClick={() => save(null)}>State nothing</Button> : null}
        </div>
      ) : (
        <p className="text-ink-soft text-small">The engineer states it.</p>
      )}
    </form>
  );
}
