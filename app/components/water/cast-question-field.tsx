import { Field } from "~/components/field";
import type { CastQuestion } from "~/readers/casts/cast-reading";

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

interface CastQuestionFieldProps {
  question: CastQuestion;
  errors: string[] | undefined;
}

/** One question of a cast's sheet with the control that answers it. An empty field stands for "as read". */
export function CastQuestionField({ question, errors }: CastQuestionFieldProps) {
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
