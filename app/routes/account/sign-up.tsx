import { getFormProps, useForm } from "@conform-to/react";
import { getZodConstraint, parseWithZod } from "@conform-to/zod/v4";
import { data, Form, Link, redirect } from "react-router";
import type { z } from "zod";
import type { Route } from "./+types/sign-up";
import { AccountPage } from "~/components/account-page";
import { FormErrors } from "~/components/field";
import { TextField } from "~/components/form-fields";
import { SubmitButton } from "~/components/submit-button";
import { actorContext } from "~/context";
import { signUpSchema } from "~/organisations/account-schema";
import { signUp } from "~/organisations/sign-up.server";
import { readForm } from "~/services/read-form.server";
import { startSession } from "~/services/session.server";

export function loader({ context }: Route.LoaderArgs) {
  if (context.get(actorContext)) throw redirect("/o");
  return null;
}

export async function action({ request }: Route.ActionArgs) {
  const submission = await readForm(request, signUpSchema);
  if (submission.status !== "success") return data(submission.reply({ hideFields: ["password"] }), { status: 400 });
  const signedUp = await signUp(submission.value);
  if (!signedUp) {
    const fieldErrors = { email: ["This address has an account already. Sign in with it instead."] };
    return data(submission.reply({ fieldErrors, hideFields: ["password"] }), { status: 400 });
  }
  return redirect(`/o/${signedUp.slug}`, {
    headers: { "Set-Cookie": await startSession(request, signedUp.userId) },
  });
}

export default function SignUp({ actionData }: Route.ComponentProps) {
  const [form, fields] = useForm<z.input<typeof signUpSchema>, z.output<typeof signUpSchema>, string[]>({
    lastResult: actionData,
    constraint: getZodConstraint(signUpSchema),
    onValidate: ({ formData }) => parseWithZod(formData, { schema: signUpSchema }),
    shouldRevalidate: "onInput",
  });
  return (
    <AccountPage title="Make an account">
      <Form method="post" {...getFormProps(form)} className="grid gap-4">
        <FormErrors errors={form.errors} id={form.errorId} />
        <TextField field={fields.organisationName} label="Organisation" autoComplete="organization" />
        <TextField
          field={fields.name}
          label="Your name"
          autoComplete="name"
          hint="As it stands on a memo, for example R. Ansel."
        />
        <TextField field={fields.email} label="E-mail address" type="email" autoComplete="username" />
        <TextField
          field={fields.password}
          label="Password"
          type="password"
          autoComplete="new-password"
          hint="At least 12 characters. A few words in a row are easy to keep; pasting is fine."
        />
        <SubmitButton busy="Making the account…">Make the account</SubmitButton>
      </Form>
      <p className="mt-6 text-slate">
        Have one already? <Link to="/sign-in">Sign in</Link>
      </p>
    </AccountPage>
  );
}
