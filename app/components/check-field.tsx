import { getInputProps, type FieldMetadata } from "@conform-to/react";

interface CheckFieldProps {
  field: FieldMetadata<boolean | undefined, Record<string, unknown>, string[]>;
  label: string;
}

/** One box to tick. */
export function CheckField({ field, label }: CheckFieldProps) {
  return (
    <label className="flex items-start gap-2">
      <input
        {...getInputProps(field, { type: "checkbox" })}
        key={field.key}
        className="mt-1 size-4 shrink-0 accent-ink"
      />
      <span>{label}</span>
    </label>
  );
}
