import { Form } from "react-router";
import { Field, FormErrors } from "~/components/field";
import { SubmitButton } from "~/components/submit-button";
import { FLAG_WORDS } from "~/quality/flags";
import { SET_FLAGS } from "~/quality/overrides";
import { REASON_LENGTH } from "~/quality/posted-quality";
import type { FormErrorsByField } from "~/storms/refusal";

interface SetFlagsFormProps {
  id: string;
  /** How many samples the filter finds. */
  found: number;
  errors: FormErrorsByField;
}

/** Sets the flag of the ticked samples, or of all that the filter finds, in place of what the tests say. */
export function SetFlagsForm({ id, found, errors }: SetFlagsFormProps) {
  return (
    <Form
      method="post"
      id={id}
      preventScrollReset
      className="mt-4 grid max-w-3xl gap-3 border-l-4 border-hairline pl-4"
    >
      <FormErrors errors={errors.samples} />
      <div className="grid items-start gap-x-4 gap-y-3 sm:grid-cols-2">
        <Field id="set-which" label="Samples">
          {(described) => (
            <select {...described} name="which" className="input">
              <option value="ticked">those ticked above</option>
              <option value="found">all {found} that the filter finds</option>
            </select>
          )}
        </Field>
        <Field id="set-flag" label="Set the flag to" errors={errors.setFlag}>
          {(described) => (
            <select {...described} name="setFlag" className="input">
              {SET_FLAGS.map((flag) => (
                <option key={flag} value={flag}>
                  {flag} · {FLAG_WORDS[flag]}
                </option>
              ))}
            </select>
          )}
        </Field>
      </div>
      <Field
        id="set-reason"
        label="Reason"
        hint="Kept with your name and the time. Estimates of the storm become out of date where it changes what they use."
        errors={errors.reason}
      >
        {(described) => <textarea {...described} name="reason" rows={2} maxLength={REASON_LENGTH} className="input" />}
      </Field>
      <div>
        <SubmitButton busy="Setting…" name="intent" value="set-flags">
          Set the flags
        </SubmitButton>
      </div>
    </Form>
  );
}
