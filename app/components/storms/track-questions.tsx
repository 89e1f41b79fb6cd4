import { useId } from "react";
import { Form } from "react-router";
import { Field } from "~/components/field";
import { SubmitButton } from "~/components/submit-button";
import type { TrackQuestion } from "~/readers/tracks/track-reading";
import type { FormErrorsByField } from "~/storms/refusal";

/** What a track's file leaves open; nothing is computed before it is answered. */
export function TrackQuestions({ questions, errors }: { questions: TrackQuestion[]; errors: FormErrorsByField }) {
  const id = useId();
  return (
    <Form method="post" className="grid max-w-2xl gap-4">
      {questions.map(({ key, message, options, suggestion }) => (
        <Field key={key} id={`${id}-${key}`} label={message} errors={errors[key]}>
          {(described) => (
            <select {...described} name={key} defaultValue={suggestion} className="input">
              {options.map(({ value, label }) => (
                <option key={value} value={value}>
                  {label}
                </option>
              ))}
            </select>
          )}
        </Field>
      ))}
      <div>
        <SubmitButton busy="Reading…" name="intent" value="answer">
          Take this track
        </SubmitButton>
      </div>
    </Form>
  );
}
