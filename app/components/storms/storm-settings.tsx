import { useId } from "react";
import { Form } from "react-router";
import { Field } from "~/components/field";
import { SectionHeading } from "~/components/section-heading";
import { SubmitButton } from "~/components/submit-button";
import type { FormErrorsByField } from "~/storms/refusal";
import { STORM_NAME_LENGTH } from "~/storms/storm-name";
import { WindowFields } from "./window-fields";

interface StormSettingsProps {
  name: string;
  /** Wall-clock times; null while the storm has no window. */
  clock: { startsAt: string; endsAt: string } | null;
  zone: string;
  errors: FormErrorsByField;
}

/** Window and name. Estimates look at the window only, so a change makes them out of date. */
export function StormSettings({ name, clock, zone, errors }: StormSettingsProps) {
  const nameId = useId();
  return (
    <>
      <SectionHeading>Window and name</SectionHeading>
      <div className="grid items-start gap-x-10 gap-y-6 lg:grid-cols-2">
        {clock && (
          <Form method="post" className="grid gap-4">
            <WindowFields
              {...clock}
              zone={zone}
              errors={errors}
              hint="Estimates take the storm from its start to its end. Leave room for the water to spin up, and for what follows the peak."
            />
            <div>
              <SubmitButton busy="Moving…" name="intent" value="window" primary={false}>
                Move the window
              </SubmitButton>
            </div>
          </Form>
        )}
        <Form method="post" className="grid gap-4">
          <Field id={nameId} label="Name of the storm" errors={errors.name}>
            {(described) => (
              <input
                {...described}
                key={name}
                name="name"
                defaultValue={name}
                required
                maxLength={STORM_NAME_LENGTH}
                autoComplete="off"
                className="input"
              />
            )}
          </Field>
          <div>
            <SubmitButton busy="Renaming…" name="intent" value="rename" primary={false}>
              Rename
            </SubmitButton>
          </div>
        </Form>
      </div>
    </>
  );
}
