import type { FieldMetadata } from "@conform-to/react";
import { CheckField } from "~/components/check-field";
import { SelectField } from "~/components/form-fields";
import type { Role } from "~/organisations/permissions";

interface StandingFieldsProps {
  fields: {
    role: FieldMetadata<Role | undefined, Record<string, unknown>, string[]>;
    mayCheck: FieldMetadata<boolean | undefined, Record<string, unknown>, string[]>;
    mayIssue: FieldMetadata<boolean | undefined, Record<string, unknown>, string[]>;
  };
  /** Those that the person at the screen may give. */
  roles: readonly Role[];
}

/** A role, and the two rights that are given by name. */
export function StandingFields({ fields, roles }: StandingFieldsProps) {
  return (
    <>
      <SelectField field={fields.role} label="Role" options={roles} className="max-w-60" />
      <fieldset className="grid gap-1">
        <legend className="mb-1 text-small font-bold text-slate">Rights</legend>
        <CheckField field={fields.mayCheck} label="may check: sign a memo as its checker" />
        <CheckField field={fields.mayIssue} label="may issue: freeze a memo as a revision" />
      </fieldset>
    </>
  );
}
