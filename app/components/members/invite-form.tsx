import { getFormProps, useForm, type SubmissionResult } from "@conform-to/react";
import { parseWithZod } from "@conform-to/zod/v4";
import { Form } from "react-router";
import type { z } from "zod";
import { StandingFields } from "./standing-fields";
import { FormErrors } from "~/components/field";
import { TextAreaField } from "~/components/form-fields";
import { SubmitButton } from "~/components/submit-button";
import { invitationSchema } from "~/organisations/members/member-schema";
import { usualStanding, type Role } from "~/organisations/permissions";

interface InviteFormProps {
  lastResult: SubmissionResult<string[]> | undefined;
  roles: readonly Role[];
}

export function InviteForm({ lastResult, roles }: InviteFormProps) {
  const [form, fields] = useForm<z.input<typeof invitationSchema>, z.output<typeof invitationSchema>, string[]>({
    id: "invite",
    lastResult,
    defaultValue: usualStanding("consultant"),
    onValidate: ({ formData }) => parseWithZod(formData, { schema: invitationSchema }),
    shouldRevalidate: "onInput",
  });
  return (
    <Form method="post" {...getFormProps(form)} className="grid max-w-2xl gap-4">
      <FormErrors errors={form.errors} id={form.errorId} />
      <TextAreaField
        field={fields.addresses}
        label="E-mail addresses"
        hint="One or many, as they come from a list or a mail program: on lines, or with commas or semicolons between."
        rows={3}
        autoComplete="off"
      />
      <StandingFields fields={fields} roles={roles} />
      <div>
        <SubmitButton busy="Inviting…" name="intent" value="invite">
          Invite
        </SubmitButton>
      </div>
    </Form>
  );
}
