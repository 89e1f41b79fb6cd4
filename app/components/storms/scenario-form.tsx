import { useId } from "react";
import { Form } from "react-router";
import { Field } from "~/components/field";
import { SectionHeading } from "~/components/section-heading";
import { SubmitButton } from "~/components/submit-button";
import { SCENARIO_LIMITS } from "~/storms/posted-scenario";
import type { FormErrorsByField } from "~/storms/refusal";
import type { ScenarioChanges } from "~/storms/scenario";
import { STORM_NAME_LENGTH } from "~/storms/storm-name";

const FIELDS: readonly {
  name: keyof ScenarioChanges;
  label: string;
  unit?: string;
  unchanged: string;
  hint: string;
}[] = [
  { name: "windFactor", label: "Wind times", unchanged: "1", hint: "Mean and gusts; 1.2 is a fifth more." },
  { name: "rainFactor", label: "Rain times", unchanged: "1", hint: "0 takes the rain away." },
  { name: "shiftHours", label: "Later by", unit: "h", unchanged: "0", hint: "Negative for earlier." },
];

/** Asks what would have been: the same storm with more wind, less rain, or at another time. */
export function ScenarioForm({ errors }: { errors: FormErrorsByField }) {
  const id = useId();
  return (
    <>
      <SectionHeading>Copy as a scenario</SectionHeading>
      <p className="mb-4 max-w-prose text-slate">
        A storm of its own, from the same records. Heat, air and sea stay as recorded: bring heat that fits where the
        wind is changed much. Estimates and memos name what was changed.
      </p>
      <Form method="post" className="grid gap-4">
        <div className="grid items-start gap-4 sm:grid-cols-3 lg:max-w-3xl">
          {FIELDS.map(({ name, label, unit, unchanged, hint }) => (
            <Field
              key={name}
              id={`${id}-${name}`}
              label={label}
              unit={unit}
              errors={errors[name]}
              hint={`${hint} ${SCENARIO_LIMITS[name].min} to ${SCENARIO_LIMITS[name].max}.`.replace("-", "−")}
            >
              {(described) => (
                <input
                  {...described}
                  name={name}
                  inputMode="decimal"
                  defaultValue={unchanged}
                  required
                  autoComplete="off"
                  className="input"
                />
              )}
            </Field>
          ))}
        </div>
        <Field
          id={`${id}-name`}
          label="Name of the scenario"
          optional
          hint="Without one: the storm's, with what is changed."
          errors={errors.scenarioName}
          className="lg:max-w-3xl"
        >
          {(described) => (
            <input
              {...described}
              name="scenarioName"
              maxLength={STORM_NAME_LENGTH}
              autoComplete="off"
              className="input"
            />
          )}
        </Field>
        <div>
          <SubmitButton busy="Copying…" name="intent" value="scenario" primary={false}>
            Copy the storm
          </SubmitButton>
        </div>
      </Form>
    </>
  );
}
