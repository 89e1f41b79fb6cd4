import { useNavigation } from "react-router";
import { Field } from "~/components/field";
import type { FormErrorsByField } from "~/storms/refusal";
import type { CastAnswers, CastQuestion } from "~/readers/casts/cast-reading";

function labelOf(key: CastQuestion["key"]): string {
  switch (key) {
    case "cast":
      return "Which cast";
    case "half":
      return "Way down or way up";
    case "latitude":
      return "Latitude of the cast";
    case "salinityScale":
      return "Kind of salinity";
    case "temperatureScale":
      return "Scale of temperature";
    default: {
      const [kind, channel] = key.split("-");
      return `${kind === "column" ? "Column" : "Unit"} of the ${channel}`;
    }
  }
}

interface CastQuestionsProps {
  questions: readonly CastQuestion[];
  answers: CastAnswers;
  errors: FormErrorsByField;
}

/** Questions of a cast's sheet with their fields, and the button that reads the file again with the answers. */
export function CastQuestions({ questions, answers, errors }: CastQuestionsProps) {
  const busy = useNavigation().state !== "idle";
  return (
    <>
      <div
        // Made anew after each reading, so that the fields show what is kept.
        key={JSON.stringify(answers)}
        className="mt-4 grid items-start gap-x-8 gap-y-5 md:grid-cols-2"
      >
        {questions.map((question) => (
          <CastQuestionField key={question.key} question={question} errors={errors[question.key]} />
        ))}
      </div>
      <button type="submit" name="intent" value="read" formNoValidate disabled={busy} className="button mt-5">
        Read again with these answers
      </button>
    </>
  );
}

/** One question of a cast's sheet with the control that answers it. An empty field stands for "as read". */
function CastQuestionField({ question, errors }: { question: CastQuestion; errors: string[] | undefined }) {
  const { key, needed, message, options, suggestion, answer } = question;
  const suggested = options?.find(({ value }) => value === suggestion)?.label ?? suggestion;
  const asRead = !needed && suggested !== undefined && `${suggested}`;
  return (
    <Field
      id={`answer-${key}`}
      label={labelOf(key)}
      unit={key === "latitude" ? "°" : undefined}
      optional={!needed}
      hint={message}
      errors={errors}
    >
      {(described) =>
        options ? (
          <select {...described} name={key} defaultValue={answer ?? ""} className="input">
            <option value="">{asRead ? `as read: ${asRead}` : "choose…"}</option>
            {options.map(({ value, label: text }) => (
              <option key={value} value={value}>
                {text}
              </option>
            ))}
          </select>
        ) : (
          <input
            {...described}
            name={key}
            inputMode="decimal"
            defaultValue={answer ?? ""}
            placeholder={asRead || undefined}
            autoComplete="off"
            className="input max-w-40"
          />
        )
      }
    </Field>
  );
}
