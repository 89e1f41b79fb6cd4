import { getInputProps, getSelectProps, type FieldMetadata } from "@conform-to/react";
import { Field } from "./field";

type FactField = FieldMetadata<string, Record<string, unknown>, string[]>;

interface ProjectFactsFieldsProps {
  fields: Record<"name" | "jobNumber" | "client" | "timeZone", FactField>;
  timeZones: readonly string[];
}

/** Shared by the page that begins a project and the one that changes its facts. */
export function ProjectFactsFields({ fields, timeZones }: ProjectFactsFieldsProps) {
  const texts = [
    { field: fields.name, label: "Name", hint: "As it stands at the head of every sheet." },
    { field: fields.jobNumber, label: "Job number", hint: "Estimates and memos are numbered after it." },
    { field: fields.client, label: "Client", hint: undefined },
  ];
  return (
    <>
      {texts.map(({ field, label, hint }) => (
        <Field key={field.id} id={field.id} label={label} hint={hint} errors={field.errors}>
          {(described) => (
            <input
              {...getInputProps(field, { type: "text" })}
              {...described}
              key={field.key}
              className="input"
              autoComplete="off"
            />
          )}
        </Field>
      ))}
      <Field
        id={fields.timeZone.id}
        label="Time zone"
        hint="Times are stored in UTC and shown in this zone, always with its name."
        errors={fields.timeZone.errors}
      >
        {(described) => (
          <select
            {...getSelectProps(fields.timeZone)}
            {...described}
            key={fields.timeZone.key}
            defaultValue={fields.timeZone.initialValue ?? "UTC"}
            className="input"
          >
            {timeZones.map((zone) => (
              <option key={zone}>{zone}</option>
            ))}
          </select>
        )}
      </Field>
    </>
  );
}
