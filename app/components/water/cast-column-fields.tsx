import { useId } from "react";
import { Field } from "~/components/field";
import type { FormErrorsByField } from "~/storms/refusal";

interface CastColumnFieldsProps {
  values: { name: string; source: string; layerDepth: string };
  lengthUnit: string;
  errors: FormErrorsByField;
}

/** What a cast's sheet asks beside the cast: how the column is called, where it comes from, where its layer ends. */
export function CastColumnFields({ values, lengthUnit, errors }: CastColumnFieldsProps) {
  const id = useId();
  return (
    <div className="grid max-w-2xl gap-5">
      <Field id={`${id}-name`} label="Name of the water column" errors={errors.name}>
        {(described) => (
          <input {...described} name="name" required defaultValue={values.name} autoComplete="off" className="input" />
        )}
      </Field>
      <Field
        id={`${id}-source`}
        label="Where the numbers come from"
        hint="It stands in the memo beside the file's name and SHA-256."
        errors={errors.source}
      >
        {(described) => (
          <textarea {...described} name="source" rows={2} required defaultValue={values.source} className="input" />
        )}
      </Field>
      <Field
        id={`${id}-depth`}
        label="Depth of the layer the storm works on"
        unit={lengthUnit}
        optional
        hint="Left empty, each method sheet finds it by its own step of density, 0.03 kg/m³ where it says nothing."
        errors={errors.layerDepth}
      >
        {(described) => (
          <input
            {...described}
            name="layerDepth"
            inputMode="decimal"
            defaultValue={values.layerDepth}
            autoComplete="off"
            className="input max-w-40"
          />
        )}
      </Field>
    </div>
  );
}
