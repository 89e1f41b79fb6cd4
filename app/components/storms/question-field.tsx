import { Field } from "~/components/field";
import type { ReadingAnswers, ReadingQuestion } from "~/readers/reading";
import type { PresentedReading } from "~/storms/present-reading";
import type { FormErrorsByField } from "~/storms/refusal";
import { WindSense } from "./wind-sense";

interface QuestionFieldProps {
  question: ReadingQuestion;
  sheet: {
    record: { answers: ReadingAnswers };
    reading: Pick<PresentedReading, "windHeight" | "averagingMinutes">;
    zones: readonly string[];
    sampleDirection: number | null;
  };
  errors: FormErrorsByField;
}

/** One question of a reading sheet with the control that answers it. An empty field stands for "as read". */
export function QuestionField({ question, sheet, errors }: QuestionFieldProps) {
  switch (question.key) {
    case "sheet":
      return <OptionField question={question} name="sheet" label="Sheet of the workbook" errors={errors} />;
    case "zone":
      return <ZoneField question={question} zones={sheet.zones} errors={errors} />;
    case "windHeight":
      return (
        <NumberField
          question={question}
          name="windHeight"
          label="Height of the wind above the sea"
          unit="m"
          known={sheet.reading.windHeight}
          errors={errors}
        />
      );
    case "averagingMinutes":
      return (
        <NumberField
          question={question}
          name="averagingMinutes"
          label="Averaging of the wind"
          unit="min"
          known={sheet.reading.averagingMinutes}
          errors={errors}
        />
      );
    case "directionSense":
      return <SenseField question={question} sample={sheet.sampleDirection} />;
    case "dateOrder":
      return <OptionField question={question} name="dateOrder" label="Order of day and month" errors={errors} />;
    case "serialEpoch":
      return (
        <OptionField question={question} name="serialEpoch" label="First year of the day numbers" errors={errors} />
      );
    case "columns": {
      const answer = sheet.record.answers.columns?.[String(question.column)]?.unit ?? undefined;
      return (
        <OptionField
          question={{ ...question, answer }}
          name={`unit-${question.column}`}
          label="Unit of a column"
          errors={errors}
        />
      );
    }
    case "missingCodes":
      return <CodesField question={question} answers={sheet.record.answers} />;
    case "leaveOutBadRows":
      return <LeaveOutField question={question} />;
    case "place":
      return question.options === undefined ? (
        <PositionField question={question} errors={errors} />
      ) : (
        <OptionField question={question} name="place" label="Place" errors={errors} />
      );
    case "gridMethod":
      return <OptionField question={question} name="gridMethod" label="From the grid to the place" errors={errors} />;
    case "timeAxis":
      return <OptionField question={question} name="timeAxis" label="Axis of time" errors={errors} />;
    case "accumulation":
      return <OptionField question={question} name="accumulation" label="How amounts add up" errors={errors} />;
    case "flagged":
      return <OptionField question={question} name="flagged" label="Values flagged as bad" errors={errors} />;
  }
}

const idOf = (question: ReadingQuestion) =>
  `answer-${question.key}${question.column === undefined ? "" : `-${question.column}`}`;

/** Whether the reading stands on the reader's own choice, without an answer. */
function isAsRead(question: ReadingQuestion): boolean {
  return !question.needed && question.answer === undefined;
}

function suggestion(question: ReadingQuestion, asRead = isAsRead(question), unit = ""): string {
  if (question.suggestion === undefined) return "";
  const option = question.options?.find(({ value }) => value === question.suggestion)?.label;
  const label = `${option ?? question.suggestion} ${unit}`.trim();
  return asRead ? ` As read: ${label}.` : ` Suggested: ${label}.`;
}

interface ControlProps {
  question: ReadingQuestion;
  name: string;
  label: string;
  errors: FormErrorsByField;
}

function ZoneField({
  question,
  zones,
  errors,
}: Pick<ControlProps, "question" | "errors"> & { zones: readonly string[] }) {
  return (
    <Field
      id={idOf(question)}
      label="Time zone of the stamps"
      hint={question.message + suggestion(question)}
      errors={errors.zone}
    >
      {(described) => (
        <>
          <input
            {...described}
            name="zone"
            list="time-zones"
            defaultValue={question.answer ?? ""}
            placeholder={isAsRead(question) ? question.suggestion : undefined}
            autoComplete="off"
            className="input"
          />
          <datalist id="time-zones">
            {zones.map((zone) => (
              <option key={zone} value={zone} />
            ))}
          </datalist>
        </>
      )}
    </Field>
  );
}

function PositionField({ question, errors }: Pick<ControlProps, "question" | "errors">) {
  const box = question.suggestion === undefined ? "" : ` The first study box’s middle is ${question.suggestion}.`;
  return (
    <Field id={idOf(question)} label="Place" hint={question.message + box} errors={errors.place}>
      {(described) => (
        <>
          <input
            {...described}
            name="place"
            list="study-box-middle"
            defaultValue={question.answer ?? ""}
            autoComplete="off"
            className="input max-w-60"
          />
          {question.suggestion !== undefined && (
            <datalist id="study-box-middle">
              <option value={question.suggestion} />
            </datalist>
          )}
        </>
      )}
    </Field>
  );
}

interface NumberFieldProps extends ControlProps {
  unit: string;
  /** What the reading goes by now; null where it is not known. */
  known: number | null;
}

function NumberField({ question, name, label, unit, known, errors }: NumberFieldProps) {
  return (
    <Field
      id={idOf(question)}
      label={label}
      unit={unit}
      optional={!question.needed}
      hint={question.message + suggestion(question, known !== null && isAsRead(question), unit)}
      errors={errors[name]}
    >
      {(described) => (
        <input
          {...described}
          name={name}
          inputMode="decimal"
          defaultValue={question.answer ?? ""}
          placeholder={known !== null && isAsRead(question) ? String(known) : undefined}
          autoComplete="off"
          className="input max-w-40"
        />
      )}
    </Field>
  );
}

function OptionField({ question, name, label, errors }: ControlProps) {
  return (
    <Field id={idOf(question)} label={label} hint={question.message + suggestion(question)} errors={errors[name]}>
      {(described) => (
        <select {...described} name={name} defaultValue={question.answer ?? ""} className="input">
          <option value="">{question.needed ? "choose…" : "as read"}</option>
          {question.options?.map(({ value, label: text }) => (
            <option key={value} value={value}>
              {text}
            </option>
          ))}
        </select>
      )}
    </Field>
  );
}

/** The same number drawn both ways: who knows the coast sees which is right. */
function SenseField({ question, sample }: { question: ReadingQuestion; sample: number | null }) {
  const senses = [
    { value: "from", label: "It is where the wind comes from" },
    { value: "towards", label: "It is where the wind blows towards" },
  ] as const;
  const chosen = question.answer ?? (question.needed ? undefined : question.suggestion);
  return (
    <fieldset>
      <legend className="mb-1 text-small font-bold text-slate">Sense of the direction</legend>
      <div className="grid gap-2">
        {senses.map(({ value, label }) => (
          <label key={value} className="flex items-start gap-2.5 border border-hairline px-3 py-2">
            <input
              type="radio"
              name="directionSense"
              value={value}
              defaultChecked={chosen === value}
              className="mt-1 size-4 accent-ink"
            />
            <span>
              {label}
              {sample !== null && <WindSense written={sample} sense={value} />}
            </span>
          </label>
        ))}
      </div>
      <p className="mt-1 text-small text-quiet">
        {question.message}
        {sample !== null && " Drawn for the strongest wind of the record."}
      </p>
    </fieldset>
  );
}

function CodesField({ question, answers }: { question: ReadingQuestion; answers: ReadingAnswers }) {
  const codes = answers.missingCodes?.[String(question.column)];
  const settled = codes === undefined ? "" : codes.length === 0 ? "none" : "codes";
  return (
    <Field id={idOf(question)} label="Code for missing" hint={question.message}>
      {(described) => (
        <select
          {...described}
          name={`missing-${question.column}`}
          defaultValue={settled === "codes" ? codes?.join(" ") : settled}
          className="input"
        >
          <option value="">as read: {question.suggestion} means missing</option>
          <option value="none">no: it was measured</option>
          {settled === "codes" && <option value={codes?.join(" ")}>{codes?.join(", ")}</option>}
        </select>
      )}
    </Field>
  );
}

function LeaveOutField({ question }: { question: ReadingQuestion }) {
  return (
    <div>
      <label className="flex items-start gap-2.5">
        <input
          type="checkbox"
          name="leaveOutBadRows"
          defaultChecked={question.answer === "true"}
          className="mt-1 size-4 shrink-0 accent-ink"
        />
        <span className="font-bold">Leave these lines out</span>
      </label>
      <p className="mt-1 text-small text-quiet">{question.message}</p>
    </div>
  );
}
