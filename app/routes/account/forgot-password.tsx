import { getFormProps, useForm } from "@conform-to/react";
import { getZodConstraint, parseWithZod } from "@conform-to/zod/v4";
import { data, Form, Link } from "react-router";
import type { z } from "zod";
import type { Route } from "./+types/forgot-password";
import { AccountPage } from "~/components/account-page";
import { FormErrors } from "~/components/field";
import { TextField } from "~/components/form-fields";
import { Notice } from "~/components/notice";
import { SubmitButton } from "~/components/submit-button";
import { mailIsSetUp } from "~/mail/send-mail.server";
import { forgotPasswordSchema } from "~/organisations/account-schema";
import { requestReset } from "~/organisations/reset-password.server";
import { readForm } from "~/services/read-form.server";
import { clientAddressOf } from "~/services/request-facts.server";

export function loader() {
  return { sendsMail: mailIsSetUp() };
}

export async function action({ request }: Route.ActionArgs) {
  const submission = await readForm(request, forgotPasswordSchema);
  if (submission.status !== "success") return data({ result: submission.reply(), asked: false }, { status: 400 });
  requestReset(submission.value.email, clientAddressOf(request));
  return data({ result: submission.reply(), asked: true });
}

export default function ForgotPassword({ actionData, loaderData }: Route.ComponentProps) {
  const [form, fields] = useForm<z.input<typeof forgotPasswordSchema>, z.output<typeof forgotPasswordSchema>, string[]>(
    {
      lastResult: actionData?.result,
      constraint: getZodConstraint(forgotPasswordSchema),
      onValidate: ({ formData }) => parseWithZod(formData, { schema: forgotPasswordSchema }),
      shouldRevalidate: "onInput",
    },
  );
  return (
    <AccountPage title="Reset your password">
      {actionData?.asked && (
        <Notice>
          If this address has an account, a mail with a link is on its way to it. The link works once, for half an hour.
        </Notice>
      )}
      {!loaderData.sendsMail && (
        <Notice>This server sends no mail yet. Ask its operator: the mail waits until SMTP_URL is set.</Notice>
      )}
      <Form method="post" {...getFormProps(form)} className="grid gap-4">
        <FormErrors errors={form.errors} id={form.errorId} />
        <TextField field={fields.email} label="E-mail address" type="email" autoComplete="username" />
        <SubmitButton busy="Asking…">Send me a link</SubmitButton>
      </Form>
      <p className="mt-6 text-slate">
        Remembered? <Link to="/sign-in">Sign in</Link>
      </p>
    </AccountPage>
  );
}
