import { getFormProps, useForm } from "@conform-to/react";
import { getZodConstraint, parseWithZod } from "@conform-to/zod/v4";
import { data, Form, Link, redirect } from "react-router";
import type { z } from "zod";
import type { Route } from "./+types/reset-password";
import { AccountPage } from "~/components/account-page";
import { FormErrors } from "~/components/field";
import { TextField } from "~/components/form-fields";
import { SubmitButton } from "~/components/submit-button";
import { newPasswordSchema } from "~/organisations/account-schema";
import { resetIsOpen, resetPassword } from "~/organisations/reset-password.server";
import { readForm } from "~/services/read-form.server";
import { clientAddressOf } from "~/services/request-facts.server";

export async function loader({ params }: Route.LoaderArgs) {
  const isOpen = await resetIsOpen(params.token);
  return data({ isOpen }, { status: isOpen ? 200 : 404 });
}

export async function action({ request, params }: Route.ActionArgs) {
  const submission = await readForm(request, newPasswordSchema);
  if (submission.status !== "success") return data(submission.reply({ hideFields: ["password"] }), { status: 400 });
  const changed = await resetPassword(params.token, submission.value.password, clientAddressOf(request));
  throw redirect(changed ? "/sign-in?reset" : `/reset-password/${params.token}`);
}

export default function ResetPassword({ loaderData, actionData }: Route.ComponentProps) {
  const [form, fields] = useForm<z.input<typeof newPasswordSchema>, z.output<typeof newPasswordSchema>, string[]>({
    lastResult: actionData,
    constraint: getZodConstraint(newPasswordSchema),
    onValidate: ({ formData }) => parseWithZod(formData, { schema: newPasswordSchema }),
    shouldRevalidate: "onInput",
  });
  if (!loaderData.isOpen) {
    return (
      <AccountPage title="This link no longer works">
        <p>
          It was used already, has run out, or was replaced by a later mail.{" "}
          <Link to="/reset-password">Ask for a new one</Link>.
        </p>
      </AccountPage>
    );
  }
  return (
    <AccountPage title="Choose a new password">
      <Form method="post" {...getFormProps(form)} className="grid gap-4">
        <FormErrors errors={form.errors} id={form.errorId} />
        <TextField
          field={fields.password}
          label="New password"
          type="password"
          autoComplete="new-password"
          hint="At least 12 characters. A few words in a row are easy to keep; pasting is fine."
        />
        <p className="text-small text-quiet">You are signed out everywhere, and a mail tells you of the change.</p>
        <SubmitButton busy="Changing…">Change the password</SubmitButton>
      </Form>
    </AccountPage>
  );
}
