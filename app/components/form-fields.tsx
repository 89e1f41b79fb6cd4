/** The fields that forms of conform are made of: label, control, unit, hint and message, tied together by `Field`. */
import { getInputProps, getSelectProps, getTextareaProps, type FieldMetadata } from "@conform-to/react";
import type { ComponentProps } from "react";
import { Field } from "./field";

type FormField = FieldMetadata<unknown, Record<string, unknown>, string[]>;

/** What a control takes beyond what the field itself says. */
type Control<Element extends "input" | "textarea" | "select"> = Omit<
  ComponentProps<Element>,
  "id" | "name" | "form" | "children" | "aria-describedby" | "aria-invalid"
>;

interface Texts extends Pick<ComponentProps<typeof Field>, "label" | "hint" | "optional" | "className"> {
  field: FormField;
}

type TextFieldProps = Texts & Control<"input"> & { unit?: string; type?: "text" | "email" | "password" };

export function TextField({
  field,
  label,
  unit,
  hint,
  optional,
  className,
  type = "text",
  ...control
}: TextFieldProps) {
  return (
    <Field id={field.id} {...{ label, unit, hint, optional, className }} errors={field.errors}>
      {(described) => (
        <input {...getInputProps(field, { type })} {...described} key={field.key} className="input" {...control} />
      )}
    </Field>
  );
}

/** A number as people type it: text to the browser, whose own number field drops what it cannot read without a word. */
export function NumberField(props: Omit<TextFieldProps, "type" | "inputMode"> & { unit: string }) {
  return <TextField inputMode="decimal" autoComplete="off" {...props} />;
}

export function TextAreaField({ field, label, hint, optional, className, ...control }: Texts & Control<"textarea">) {
  return (
    <Field id={field.id} {...{ label, hint, optional, className }} errors={field.errors}>
      {(described) => (
        <textarea {...getTextareaProps(field)} {...described} key={field.key} className="input" {...control} />
      )}
    </Field>
  );
}

type SelectFieldProps = Texts &
  Control<"select"> & {
    /** A text stands for itself. */
    options: readonly (string | { value: string; label: string })[];
  };

export function SelectField({ field, label, hint, optional, className, options, ...control }: SelectFieldProps) {
  return (
    <Field id={field.id} {...{ label, hint, optional, className }} errors={field.errors}>
      {(described) => (
        <select {...getSelectProps(field)} {...described} key={field.key} className="input" {...control}>
          {options.map((option) => {
            const { value, label: text } = typeof option === "string" ? { value: option, label: option } : option;
            return (
              <option key={value} value={value}>
                {text}
              </option>
            );
          })}
        </select>
      )}
    </Field>
  );
}
