import { getFormProps, useForm, type SubmissionResult } from "@conform-to/react";
import { parseWithZod } from "@conform-to/zod/v4";
import type { ReactNode } from "react";
import { Form } from "react-router";
import type { z } from "zod";
import { FormErrors } from "./field";
import { SelectField, TextAreaField, TextField } from "./form-fields";
import { SubmitButton } from "./submit-button";
import { memoSchema, type MemoValues } from "~/memo/memo-schema";
import { MEMO_PURPOSES } from "~/memo/purposes";

type MemoFormValues = z.input<typeof memoSchema>;

export interface EstimateChoice {
  id: string;
  /** `2617-07` */
  code: string;
  /** Box in storm. */
  name: string;
  /** As `current`, `out of date: column edited`. */
  state: string;
}

interface MemoFieldsProps {
  lastResult?: SubmissionResult<string[]>;
  choices: EstimateChoice[];
  values: Partial<MemoFormValues>;
  submit: string;
  draftedFindings?: string;
  children?: ReactNode;
}

/** Shared by the page that begins a memo and the one that writes it. */
export function MemoFields({ lastResult, choices, values, submit, draftedFindings, children }: MemoFieldsProps) {
  const [form, fields] = useForm<MemoFormValues, MemoValues, string[]>({
    id: "memo",
    lastResult,
    defaultValue: values,
    onValidate: ({ formData }) => parseWithZod(formData, { schema: memoSchema }),
    shouldRevalidate: "onInput",
  });
  const chosen = new Set(values.estimates);
  return (
    <Form method="post" {...getFormProps(form)} className="grid gap-4">
      <FormErrors errors={form.errors} id={form.errorId} />
      <TextField field={fields.title} label="Title" autoComplete="off" />
      <TextAreaField
        field={fields.question}
        label="Question"
        hint="What the client asks, and the decision that hangs on the answer."
        rows={3}
      />
      <TextAreaField
        field={fields.findings}
        label="Bottom line"
        hint="Left empty, it is drafted from the responses, with the range and what drives it."
        rows={5}
        placeholder={draftedFindings}
        optional
      />
      <SelectField field={fields.purpose} label="Issued for" options={MEMO_PURPOSES} />
      <fieldset
        id={fields.estimates.id}
        tabIndex={-1}
        aria-describedby={fields.estimates.errors ? fields.estimates.errorId : undefined}
        className="border border-hairline p-4"
      >
        <legend className="px-1 text-small font-bold text-slate">Estimates, in this order</legend>
        {choices.map(({ id, code, name, state }) => (
          <label key={id} className="flex items-start gap-2.5 py-1">
            <input
              type="checkbox"
              name={fields.estimates.name}
              value={id}
              defaultChecked={chosen.has(id)}
              className="mt-1 size-4 shrink-0 accent-ink"
            />
            <span>
              <span className="font-bold">{code}</span> {name} <span className="text-small text-quiet">{state}</span>
            </span>
          </label>
        ))}
        {fields.estimates.errors && (
          <p id={fields.estimates.errorId} className="mt-1 text-small font-bold text-error">
            {fields.estimates.errors.join(" ")}
          </p>
        )}
      </fieldset>
      <div className="flex flex-wrap gap-2">
        <SubmitButton busy="Saving…" name="intent" value="save">
          {submit}
        </SubmitButton>
        {children}
      </div>
    </Form>
  );
}
