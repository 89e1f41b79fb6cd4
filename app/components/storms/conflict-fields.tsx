import type { ReactNode } from "react";
import type { FormErrorsByField } from "~/storms/refusal";

interface ConflictFieldsProps {
  conflicts: { group: string; label: string; heldBy: string }[];
  recordName: string;
  errors: FormErrorsByField;
}

/** Where the storm already has a channel, the person says which of the two records it is taken from. */
export function ConflictFields({ conflicts, recordName, errors }: ConflictFieldsProps) {
  if (conflicts.length === 0) return null;
  const trouble = conflicts.flatMap(({ group }) => errors[`choice-${group}`] ?? []);
  return (
    <fieldset aria-describedby={trouble.length > 0 ? "choices-error" : undefined}>
      <legend className="mb-2 text-small font-bold text-slate">
        The storm already has some of this: which is to be used?
      </legend>
      {trouble.length > 0 && (
        <p id="choices-error" className="mb-2 text-small font-bold text-error">
          {trouble.join(" ")}
        </p>
      )}
      <ul>
        {conflicts.map(({ group, label, heldBy }) => (
          <li key={group} className="grid gap-x-6 border-t border-hairline py-2 sm:grid-cols-[10rem_1fr_1fr]">
            <span className="font-bold">{label}</span>
            <Choice group={group} value="keep" label={label}>
              keep what is in use, from {heldBy}
            </Choice>
            <Choice group={group} value="replace" label={label}>
              take this sheet's, from {recordName}
            </Choice>
          </li>
        ))}
      </ul>
    </fieldset>
  );
}

interface ChoiceProps {
  group: string;
  value: "keep" | "replace";
  label: string;
  children: ReactNode;
}

function Choice({ group, value, label, children }: ChoiceProps) {
  return (
    <label className="flex items-start gap-2.5 py-0.5">
      <input type="radio" name={`choice-${group}`} value={value} required className="mt-1 size-4 shrink-0 accent-ink" />
      <span>
        <span className="sr-only">{label}: </span>
        {children}
      </span>
    </label>
  );
}
