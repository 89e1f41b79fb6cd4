import { getFormProps, useForm, type FieldMetadata, type SubmissionResult } from "@conform-to/react";
import { parseWithZod } from "@conform-to/zod/v4";
import { useMemo, type ReactNode } from "react";
import { Form } from "react-router";
import type { z } from "zod";
import { FormErrors } from "~/components/field";
import { NumberField, SelectField, TextAreaField, TextField } from "~/components/form-fields";
import { SubmitButton } from "~/components/submit-button";
import { fromDisplay } from "~/units/format-quantity";
import { displayUnit } from "~/units/quantities";
import type { UnitChoices } from "~/units/unit-choices";
import { presentColumn, type PresentedColumn } from "~/water/present-column";
import type { SalinityScale } from "~/water/water-density";
import { SALINITY_SCALES, scaleUnit, waterSchema, type WaterValues } from "~/water/water-schema";
import { LayerSketch } from "./layer-sketch";

type WaterFormValues = z.input<ReturnType<typeof waterSchema>>;

interface WaterFormProps {
  lastResult?: SubmissionResult<string[]>;
  units: UnitChoices;
  values: Partial<WaterFormValues>;
  /** Beside the button that saves. */
  children?: ReactNode;
}

/** Shared by the page that makes a column and the one that changes it. */
export function WaterForm({ lastResult, units, values, children }: WaterFormProps) {
  const schema = useMemo(() => waterSchema(units), [units]);
  const [form, fields] = useForm<WaterFormValues, WaterValues, string[]>({
    lastResult,
    defaultValue: values,
    onValidate: ({ formData }) => parseWithZod(formData, { schema }),
    shouldRevalidate: "onInput",
  });
  const scale: SalinityScale = fields.salinityScale.value === "practical" ? "practical" : "absolute";
  const typed = (field: FieldMetadata<number | undefined>) => numberOf(field.value);
  const drawn = presentTyped(
    {
      temperature: typed(fields.temperature),
      salinity: typed(fields.salinity),
      layerDepth: typed(fields.layerDepth),
      belowTemperature: typed(fields.belowTemperature),
      belowSalinity: typed(fields.belowSalinity),
    },
    scale,
    units,
  );
  return (
    <Form method="post" {...getFormProps(form)}>
      <FormErrors errors={form.errors} id={form.errorId} />
      <div className="grid items-start gap-x-10 gap-y-6 lg:grid-cols-[minmax(0,1fr)_minmax(0,26rem)]">
        <div className="grid gap-5">
          <TextField field={fields.name} label="Name" autoComplete="off" />
          <TextAreaField
            field={fields.source}
            label="Where the numbers come from"
            hint="Cast, mooring, atlas or judgement, with place and date. It stands in the memo."
            rows={2}
          />
          <SelectField field={fields.salinityScale} label="Scale of the salinities" options={SALINITY_SCALES} />
          <fieldset className="grid gap-4 border border-hairline p-4 sm:grid-cols-3">
            <legend className="px-1 text-small font-bold text-slate">The layer the storm works on</legend>
            <NumberField field={fields.temperature} label="Temperature" unit="°C" />
            <NumberField field={fields.salinity} label="Salinity" unit={scaleUnit(scale)} />
            <NumberField field={fields.layerDepth} label="Depth" unit={displayUnit("layerDepth", units).unit} />
          </fieldset>
          <fieldset className="grid gap-4 border border-hairline p-4 sm:grid-cols-3">
            <legend className="px-1 text-small font-bold text-slate">
              Water below <span className="font-normal text-quiet">· optional, both or neither</span>
            </legend>
            <NumberField field={fields.belowTemperature} label="Temperature" unit="°C" />
            <NumberField field={fields.belowSalinity} label="Salinity" unit={scaleUnit(scale)} />
            <p className="text-small text-quiet sm:pt-6">Without it there is no density step, and no deepening.</p>
          </fieldset>
        </div>
        <div>
          <LayerSketch column={drawn} />
          <p className="mt-1 text-small text-quiet" aria-live="polite">
            {drawn
              ? "Potential densities referred to the surface, by TEOS-10. Not to scale."
              : "Densities appear as you type."}
          </p>
        </div>
      </div>
      <div className="mt-6 flex flex-wrap gap-2">
        <SubmitButton busy="Saving…">Save the column</SubmitButton>
        {children}
      </div>
    </Form>
  );
}

function numberOf(text: string | undefined): number | null {
  const number = text === undefined || text.trim() === "" ? Number.NaN : Number(text);
  return Number.isFinite(number) ? number : null;
}

type Typed = Record<"temperature" | "salinity" | "layerDepth" | "belowTemperature" | "belowSalinity", number | null>;

/** What can be drawn of the numbers typed so far; null until the layer is whole and possible. */
function presentTyped(typed: Typed, salinityScale: SalinityScale, units: UnitChoices): PresentedColumn | null {
  const { temperature, salinity, layerDepth, belowTemperature, belowSalinity } = typed;
  if (temperature === null || salinity === null || layerDepth === null) return null;
  if (![salinity, belowSalinity ?? 0].every((value) => value >= 0 && value <= 42) || layerDepth <= 0) return null;
  if (![temperature, belowTemperature ?? 0].every((value) => value >= -2.5 && value <= 40)) return null;
  const below =
    belowTemperature === null || belowSalinity === null
      ? null
      : { temperature: belowTemperature, salinity: belowSalinity };
  const metres = Math.min(fromDisplay(layerDepth, "layerDepth", units), 11_000);
  return presentColumn({ temperature, salinity, salinityScale, layerDepth: metres, below }, units);
}
