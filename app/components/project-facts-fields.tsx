import type { FieldMetadata } from "@conform-to/react";
import { SelectField, TextField } from "./form-fields";

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
        <TextField key={field.id} field={field} label={label} hint={hint} autoComplete="off" />
      ))}
      <SelectField
        field={fields.timeZone}
        label="Time zone"
        hint="Times are stored in UTC and shown in this zone, always with its name."
        defaultValue={fields.timeZone.initialValue ?? "UTC"}
        options={timeZones}
      />
    </>
  );
}
