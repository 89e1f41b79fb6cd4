import { Field } from "~/components/field";
import type { FormGroup } from "~/quality/thresholds-form";
import type { FormErrorsByField } from "~/storms/refusal";

interface ThresholdFieldsProps {
  groups: readonly FormGroup[];
  errors: FormErrorsByField;
  disabled: boolean;
}

/** The thresholds of each test with its unit, the default beside it, and where the default comes from. */
export function ThresholdFields({ groups, errors, disabled }: ThresholdFieldsProps) {
  return groups.map(({ test, source, fields }) => (
    <fieldset key={test} disabled={disabled} className="border-t border-hairline pt-3">
      <legend className="float-left w-full font-bold">{test[0].toUpperCase() + test.slice(1)}</legend>
      {source !== "" && <p className="clear-left max-w-prose text-small text-quiet">Defaults: {source}.</p>}
      <div className="clear-left mt-3 grid items-start gap-4 sm:grid-cols-2 lg:grid-cols-4">
        {fields.map(({ name, label, unit, value, byDefault }) => (
          <Field
            key={name}
            id={`threshold-${name}`}
            label={label}
            unit={unit || undefined}
            hint={`default: ${byDefault.replace("-", "−")}`}
            errors={errors[name]}
          >
            {(described) => (
              <input
                {...described}
                name={name}
                defaultValue={value}
                inputMode="decimal"
                autoComplete="off"
                className="input"
              />
            )}
          </Field>
        ))}
      </div>
    </fieldset>
  ));
}
