import { useId } from "react";
import { Form } from "react-router";
import { Field, FormErrors } from "~/components/field";
import { SectionHeading } from "~/components/section-heading";
import { SubmitButton } from "~/components/submit-button";
import { CONSTANT_KINDS } from "~/storms/constant-kinds";
import { WHOLE_FORM, type FormErrorsByField } from "~/storms/refusal";
import { OriginalFields } from "./original-fields";

interface AddRecordProps {
  errors: FormErrorsByField;
  uploadLimitBytes: number;
  /** A constant needs a window to stand over. */
  hasWindow: boolean;
}

/** Rain and heat often come from elsewhere: another file, a spreadsheet, or one number for the whole storm. */
export function AddRecord({ errors, uploadLimitBytes, hasWindow }: AddRecordProps) {
  const id = useId();
  return (
    <>
      <SectionHeading>Add rain, heat or other wind</SectionHeading>
      <FormErrors errors={errors[WHOLE_FORM]} />
      <div className="grid items-start gap-x-10 gap-y-6 lg:grid-cols-2">
        <Form method="post" encType="multipart/form-data" className="grid gap-4">
          <OriginalFields uploadLimitBytes={uploadLimitBytes} errors={errors} />
          <div>
            <SubmitButton busy="Reading…" name="intent" value="original" primary={false}>
              Read it
            </SubmitButton>
          </div>
        </Form>
        {hasWindow && (
          <Form method="post" className="grid gap-4">
            <Field id={`${id}-kind`} label="Or one value over the whole window" errors={errors.kind}>
              {(described) => (
                <select {...described} name="kind" className="input">
                  {CONSTANT_KINDS.map((kind) => (
                    <option key={kind.id} value={kind.id}>
                      {kind.name} ({kind.unit})
                    </option>
                  ))}
                </select>
              )}
            </Field>
            <Field
              id={`${id}-value`}
              label="Value, in the unit chosen above"
              hint="It follows the window when that is moved. Heat is positive into the sea."
              errors={errors.value}
            >
              {(described) => (
                <input
                  {...described}
                  name="value"
                  inputMode="decimal"
                  required
                  autoComplete="off"
                  className="input max-w-40"
                />
              )}
            </Field>
            <div>
              <label className="flex items-start gap-2.5">
                <input type="checkbox" name="replace" className="mt-1 size-4 shrink-0 accent-ink" />
                Use it in place of what the storm has now
              </label>
              {errors.replace && <p className="mt-1 text-small font-bold text-error">{errors.replace.join(" ")}</p>}
            </div>
            <div>
              <SubmitButton busy="Adding…" name="intent" value="constant" primary={false}>
                Add the constant
              </SubmitButton>
            </div>
          </Form>
        )}
      </div>
    </>
  );
}
