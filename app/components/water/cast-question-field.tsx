import { Field } from "~/components/field";
import type { CastQuestion } from "~/readers/casts/cast-reading";

const LABELS: Record<CastQuestion["key"], { label: string; unit?: string }> = {
  half: { label: "Way down or way up" },
  latitude: { label: "Latitude of the cast", unit: "°" },
  salinityScale: { label: "Kind of salinity" },
  temperatureScale: { label: "Scale of temperature" },
};

interface CastQuestionFieldProps {
  question: CastQuestion;
  errors: string[] | undefined;
}

/** One question of a cast's sheet with the control that answers it. An empty field stands for "as read". */
export function CastQuestionField({ question, errors }: CastQuestionFieldProps) {
  const { key, needed, message, options, suggestion, answer } = question;
  const { label, unit } = LABELS[key];
  const suggested = options?.find(({ value }) => value === suggestion)?.label ?? suggestion;
  const asRead = !needed && suggested !== undefined && `${suggested}`;
  return (
    <Field id={`answer-${key}`} label={label} unit={unit} optional={!needed} hint={message} errors={errors}>
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
