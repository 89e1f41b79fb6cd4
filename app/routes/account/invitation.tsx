import { getFormProps, useForm } from "@conform-to/react";
import { getZodConstraint, parseWithZod } from "@conform-to/zod/v4";
import { data, Form, Link, redirect } from "react-router";
import type { z } from "zod";
import type { Route } from "./+types/invitation";
import { AccountPage } from "~/components/account-page";
import { FormErrors } from "~/components/field";
import { TextField } from "~/components/form-fields";
import { SubmitButton } from "~/components/submit-button";
import { actorContext } from "~/context";
import { newcomerSchema } from "~/organisations/account-schema";
import { acceptAsNewcomer, acceptAsUser, openInvitation } from "~/organisations/members/accept-invitation.server";
import { readForm } from "~/services/read-form.server";
import { startSession } from "~/services/session.server";

export async function loader({ context, params }: Route.LoaderArgs) {
  const invitation = await openInvitation(params.token);
  const actor = context.get(actorContext);
  if (!invitation) return data({ invitation: null, signedInAs: null, to: "" }, { status: 404 });
  return data({ invitation, signedInAs: actor?.email ?? null, to: `/invitations/${params.token}` });
}

export async function action({ request, context, params }: Route.ActionArgs) {
  const actor = context.get(actorContext);
  if (actor) {
    const to = await acceptAsUser(params.token, actor);
    throw redirect(to ?? `/invitations/${params.token}`);
  }
  const submission = await readForm(request, newcomerSchema);
  if (submission.status !== "success") return data(submission.reply({ hideFields: ["password"] }), { status: 400 });
  const joined = await acceptAsNewcomer(params.token, submission.value);
  if (!joined) throw redirect(`/invitations/${params.token}`);
  throw redirect(joined.to, { headers: { "Set-Cookie": await startSession(request, joined.userId) } });
}

function NewcomerForm({ lastResult }: { lastResult: Route.ComponentProps["actionData"] }) {
  const [form, fields] = useForm<z.input<typeof newcomerSchema>, z.output<typeof newcomerSchema>, string[]>({
    lastResult,
    constraint: getZodConstraint(newcomerSchema),
    onValidate: ({ formData }) => parseWithZod(formData, { schema: newcomerSchema }),
    shouldRevalidate: "onInput",
  });
  return (
    <Form method="post" {...getFormProps(form)} className="grid gap-4">
      <FormErrors errors={form.errors} id={form.errorId} />
      <TextField
        field={fields.name}
        label="Your name"
        autoComplete="name"
        hint="As it stands on a memo, for example R. Ansel."
      />
      <TextField
        field={fields.password}
        label="Password"
        type="password"
        autoComplete="new-password"
        hint="At least 12 characters. A few words in a row are easy to keep; pasting is fine."
      />
      <SubmitButton busy="Making the account…">Make the account and join</SubmitButton>
    </Form>
  );
}

export default function Invitation({ loaderData, actionData }: Route.ComponentProps) {
  const { invitation, signedInAs, to } = loaderData;
  if (!invitation) {
    return (
      <AccountPage title="This invitation no longer works">
        <p>
          Its link was used already, has run out, or was replaced by a later mail. Ask whoever invited you to send it
          again. If you have joined already, <Link to="/sign-in">sign in</Link>.
        </p>
      </AccountPage>
    );
  }
  const { email, organisation, role, invitedBy, hasAccount } = invitation;
  return (
    <AccountPage title={`Join ${organisation}`}>
      <p className="mb-6">
        {invitedBy} invites {email} to work in {organisation} as {role}.
      </p>
      {signedInAs === email && (
        <Form method="post">
          <SubmitButton busy="Joining…">Accept</SubmitButton>
        </Form>
      )}
      {signedInAs !== null && signedInAs !== email && (
        <>
          <p className="mb-4">You are signed in as {signedInAs}. Sign out, then open the link of the mail again.</p>
          <Form method="post" action="/sign-out">
            <SubmitButton busy="Signing out…">Sign out</SubmitButton>
          </Form>
        </>
      )}
      {signedInAs === null && hasAccount && (
        <Link to={`/sign-in?to=${encodeURIComponent(to)}`} className="button button-primary">
          Sign in to accept
        </Link>
      )}
      {signedInAs === null && !hasAccount && <NewcomerForm lastResult={actionData} />}
    </AccountPage>
  );
}
