"use client";

import { zodResolver } from "@hookform/resolvers/zod";
import { useForm } from "react-hook-form";
import { Button } from "@/components/ui/button";
import { ChoiceField } from "@/components/ui/choice-field";
import { Notice } from "@/components/ui/notice";
import { QuantityField } from "@/components/ui/quantity-field";
import { type LimitField, limitGroups } from "./limit-fields";
import { type Chosen, type SettingsTyped, typedSettings, typedSettingsSchema, usualFigure } from "./settings-typed";
import { useSavePart } from "./use-save-part";

type SettingsFormProps = { test: string; settings: Chosen | undefined };

/** Which reduction is the headline, how readings are weighed, and what the checks hold the test against. */
export function SettingsForm({ test, settings }: SettingsFormProps) {
  const { save, refused } = useSavePart<Chosen>(test, "settings");
  const form = useForm<SettingsTyped, unknown, Chosen>({ resolver: zodResolver(typedSettingsSchema), values: typedSettings(settings) });
  const { errors, isSubmitting } = form.formState;
  return (
    <form onSubmit={form.handleSubmit(save)} noValidate className="flex flex-col gap-5">
      <div className="grid gap-x-6 gap-y-3 sm:grid-cols-2">
        <ChoiceField id="s-method" label="Result in the headline" hint="The other one is shown beside it." {...form.register("method")}>
          <option value="classical">Classical reduction (usual)</option>
          <option value="generalised">Generalised reduction, where the hull’s offsets are known</option>
        </ChoiceField>
        <ChoiceField id="s-weights" label="Readings in the line" hint={weightsHint} {...form.register("weights")}>
          <option value="equal">All count alike (usual)</option>
          <option value="readings">Each by how well it is known</option>
        </ChoiceField>
      </div>
      {limitGroups.map(({ title, fields }) => (
        <fieldset key={title} className="grid items-start gap-x-6 gap-y-3 sm:grid-cols-2 lg:grid-cols-3">
          <legend className="mb-2 font-bold">{title}</legend>
          {fields.map((field) => (
            <QuantityField
              key={field.name}
              id={`s-${field.name}`}
              label={field.label}
              unit={field.unit}
              hint={hintOf(field)}
              error={errors.limits?.[field.name]?.message}
              {...form.register(`limits.${field.name}`)}
            />
          ))}
        </fieldset>
      ))}
      {refused ? <Notice tone="refused">{refused}</Notice> : null}
      <div className="flex flex-wrap gap-3">
        <Button type="submit" weight="now" disabled={isSubmitting}>
          Set them for this test
        </Button>
        {isUsual(settings) ? null : <Button onClick={() => save(null)}>Back to the usual</Button>}
      </div>
    </form>
  );
}

const weightsHint =
  "By the scatter of its own marks, and not by less than the standard uncertainty of a resting point. Gusts that move all stations alike are not in it: where they rule, all alike is right.";

function hintOf(field: LimitField): string {
  const usual = `Usual: ${usualFigure(field)}${field.unit === "" || field.unit === "°" ? field.unit : ` ${field.unit}`}.`;
  return field.hint ? `${field.hint} ${usual}` : usual;
}

function isUsual(settings: Chosen | undefined): boolean {
  return ![settings?.method, settings?.weights, settings?.limits, settings?.agreement].some((chosen) => chosen !== undefined);
}
