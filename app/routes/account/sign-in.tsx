import { getFormProps, useForm } from "@conform-to/react";
import { getZodConstraint, parseWithZod } from "@conform-to/zod/v4";
import { data, Form, Link, redirect, useSearchParams } from "react-router";
import type { z } from "zod";
import type { Route } from "./+types/sign-in";
import { AccountPage } from "~/components/account-page";
import { FormErrors } from "~/components/field";
import { TextField } from "~/components/form-fields";
import { Notice } from "~/components/notice";
import { SubmitButton } from "~/components/submit-button";
import { actorContext } from "~/context";
import { signInSchema } from "~/organisations/account-schema";
import { startSession } from "~/services/session.server";
import { SignInRefused, signInWithPassword } from "~/services/sign-in.server";
import { localPath } from "~/services/local-path.server";

export function loader({ context }: Route.LoaderArgs) {
  if (context.get(actorContext)) throw redirect("/o");
  return null;
}

export async function action({ request }: Route.ActionArgs) {
  const form = await request.clone().formData();
  const submission = parseWithZod(form, { schema: signInSchema });
  if (submission.status !== "success") return data(submission.reply({ hideFields: ["password"] }), { status: 400 });
  try {
    const user = await signInWithPassword(request);
    return redirect(localPath(submission.value.to) ?? "/o", {
      headers: { "Set-Cookie": await startSession(request, user.id) },
    });
  } catch (error) {
    if (!(error instanceof SignInRefused)) throw error;
    return data(submission.reply({ formErrors: [error.message], hideFields: ["password"] }), { status: 400 });
  }
}

export default function SignIn({ actionData }: Route.ComponentProps) {
  const [form, fields] = useForm<z.input<typeof signInSchema>, z.output<typeof signInSchema>, string[]>({
    lastResult: actionData,
    constraint: getZodConstraint(signInSchema),
    onValidate: ({ formData }) => parseWithZod(formData, { schema: signInSchema }),
    shouldRevalidate: "onInput",
  });
  const [search] = useSearchParams();
  return (
    <AccountPage title="Sign in">
      {search.has("reset") && <Notice>Your password is changed. Sign in with it.</Notice>}
      <Form method="post" {...getFormProps(form)} className="grid gap-4">
        <FormErrors errors={form.errors} id={form.errorId} />
        <input type="hidden" name="to" value={search.get("to") ?? ""} />
        <TextField field={fields.email} label="E-mail address" type="email" autoComplete="username" />
        <TextField field={fields.password} label="Password" type="password" autoComplete="current-password" />
        <SubmitButton busy="Signing in…">Sign in</SubmitButton>
      </Form>
      <p className="mt-6 text-slate">
        <Link to="/reset-password">Forgot your password?</Link>
      </p>
      <p className="mt-2 text-slate">
        New here? <Link to="/sign-up">Make an account for your organisation</Link>
      </p>
    </AccountPage>
  );
}
