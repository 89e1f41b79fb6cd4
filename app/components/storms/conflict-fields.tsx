import type { FormErrorsByField } from "~/storms/refusal";

interface ConflictFieldsProps {
  conflicts: { group: string; label: string; heldBy: string }[];
  recordName: string;
  errors: FormErrorsByField;
}

/** Where the storm already has a channel, the person says which of the two records it is taken from. */
export function ConflictFields({ conflicts, recordName, errors }: ConflictFieldsProps) {
  return conflicts.map(({ group, label, heldBy }) => {
    const name = `choice-${group}`;
    const trouble = errors[name];
    return (
      <fieldset key={group} aria-describedby={trouble ? `${name}-error` : undefined}>
        <legend className="mb-1 text-small font-bold text-slate">The storm already has {label}</legend>
        {[
          { value: "keep", text: `keep that from ${heldBy}` },
          { value: "replace", text: `use that from ${recordName} in its place` },
        ].map(({ value, text }) => (
          <label key={value} className="flex items-start gap-2.5 py-1">
            <input type="radio" name={name} value={value} className="mt-1 size-4 shrink-0 accent-ink" />
            {text}
          </label>
        ))}
        {trouble && (
          <p id={`${name}-error`} className="text-small font-bold text-error">
            {trouble.join(" ")}
          </p>
        )}
      </fieldset>
    );
  });
}
