import { Field } from "~/components/field";
import type { FormErrorsByField } from "~/storms/refusal";

interface WindowFieldsProps {
  /** Wall-clock times of `zone`, as `2026-11-04 20:00`. */
  startsAt: string;
  endsAt: string;
  zone: string;
  errors: FormErrorsByField;
  hint?: string;
}

/** The start and end of a storm on the project's wall clock. */
export function WindowFields({ startsAt, endsAt, zone, errors, hint }: WindowFieldsProps) {
  const ends = [
    { name: "startsAt", label: "Start", value: startsAt },
    { name: "endsAt", label: "End", value: endsAt },
  ];
  return (
    <div className="grid gap-x-4 gap-y-3 sm:grid-cols-2">
      {ends.map(({ name, label, value }) => (
        <Field key={name} id={`window-${name}`} label={label} unit={zone} errors={errors[name]}>
          {(described) => (
            <input
              {...described}
              key={value}
              inputMode="numeric"
              autoComplete="off"
              placeholder="2026-11-04 20:00"
              name={name}
              defaultValue={value}
              required
              className="input"
            />
          )}
        </Field>
      ))}
      {hint && <p className="text-small text-quiet sm:col-span-2">{hint}</p>}
    </div>
  );
}
