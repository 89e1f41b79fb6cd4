import { getFormProps, useForm, type SubmissionResult } from "@conform-to/react";
import { parseWithZod } from "@conform-to/zod/v4";
import { useMemo, useState, type ReactNode } from "react";
import { Form, useNavigation } from "react-router";
import type { z } from "zod";
import { FormErrors } from "./field";
import { NumberField, SelectField, TextField } from "./form-fields";
import { BoxEditor } from "./map/box-editor";
import { SubmitButton } from "./submit-button";
import { boxSchema, type BoxValues, MOST_TRIGGER_LEVELS, TRIGGER_QUANTITY_IDS } from "~/area/box-schema";
import { TRIGGER_QUANTITIES, type Position } from "~/ocean/scenario";
import { displayUnit, quantity } from "~/units/quantities";
import type { UnitChoices } from "~/units/unit-choices";

type BoxFormValues = z.input<ReturnType<typeof boxSchema>>;

const TRIGGER_CHOICES = TRIGGER_QUANTITIES.map((id) => ({ value: id, label: quantity(TRIGGER_QUANTITY_IDS[id]).name }));

interface StudyBoxFormProps {
  lastResult?: SubmissionResult<string[]>;
  units: UnitChoices;
  otherBoxes: { name: string; polygon: Position[] }[];
  ring: Position[] | null;
  /** As shown, in the organisation's units. */
  values?: Omit<BoxFormValues, "polygon">;
  children?: ReactNode;
}

/** Shared by the page that draws a box and the one that changes it. */
export function StudyBoxForm({ lastResult, units, otherBoxes, ring: stored, values, children }: StudyBoxFormProps) {
  const [ring, setRing] = useState<Position[] | null>(stored);
  const schema = useMemo(() => boxSchema(units), [units]);
  const busy = useNavigation().state !== "idle";
  const [form, fields] = useForm<BoxFormValues, BoxValues, string[]>({
    lastResult: busy ? undefined : lastResult,
    defaultValue: values,
    onValidate: ({ formData }) => parseWithZod(formData, { schema }),
    shouldRevalidate: "onInput",
  });
  const measures = [
    { field: fields.waterDepth, label: "Water depth", unit: displayUnit("depth", units).unit },
    {
      field: fields.shoreNormal,
      label: "Shore normal",
      unit: "° true",
      hint: "The bearing that points straight offshore. With it, transport is told along and across the shore.",
    },
    { field: fields.distanceToShore, label: "Distance to the shore", unit: displayUnit("distance", units).unit },
  ];
  const levels = fields.triggerLevels.getFieldList();
  return (
    <Form method="post" {...getFormProps(form)} className="grid gap-6">
      <FormErrors errors={form.errors} id={form.errorId} />
      <BoxEditor
        value={ring}
        onChange={setRing}
        otherBoxes={otherBoxes}
        units={units}
        errors={fields.polygon.errors ?? []}
      />
      <div className="grid gap-4 sm:grid-cols-2 lg:grid-cols-4">
        <TextField field={fields.name} label="Name" autoComplete="off" />
        {measures.map(({ field, label, unit, hint }) => (
          <NumberField key={field.id} field={field} label={label} unit={unit} hint={hint} optional />
        ))}
      </div>
      <fieldset className="border border-hairline p-4">
        <legend className="px-1 text-small font-bold text-slate">Trigger levels</legend>
        <p className="text-small text-quiet">
          A client’s limits: what counts is the time beyond the value, and whether it reaches the hours.
        </p>
        {levels.map((level, index) => {
          const parts = level.getFieldset();
          const chosen = TRIGGER_QUANTITIES.find((id) => id === parts.quantity.value) ?? "salinity";
          return (
            <div
              key={level.key}
              className="mt-3 grid grid-cols-2 items-start gap-3 sm:grid-cols-[2fr_1fr_1fr_1fr_auto]"
            >
              <SelectField field={parts.quantity} label="Quantity" options={TRIGGER_CHOICES} />
              <SelectField field={parts.side} label="Side" options={["below", "above"]} />
              <NumberField
                field={parts.value}
                label="Value"
                unit={displayUnit(TRIGGER_QUANTITY_IDS[chosen], units).unit}
              />
              <NumberField field={parts.hours} label="For" unit="h" />
              <button
                {...form.remove.getButtonProps({ name: fields.triggerLevels.name, index })}
                className="button sm:mt-6"
                aria-label={`Remove trigger level ${index + 1}`}
              >
                Remove
              </button>
            </div>
          );
        })}
        {levels.length < MOST_TRIGGER_LEVELS && (
          <button
            {...form.insert.getButtonProps({
              name: fields.triggerLevels.name,
              defaultValue: { quantity: "salinity", side: "below", hours: 6 },
            })}
            className="button mt-3"
          >
            Add a trigger level
          </button>
        )}
      </fieldset>
      <div className="flex flex-wrap gap-2">
        <SubmitButton busy="Saving…">Save the box</SubmitButton>
        {children}
      </div>
    </Form>
  );
}
