import { getFormProps, useForm } from "@conform-to/react";
import { parseWithZod } from "@conform-to/zod/v4";
import { data, Form, Link, redirect } from "react-router";
import type { Route } from "./+types/member";
import { FormErrors } from "~/components/field";
import { MemberSteps } from "~/components/members/member-steps";
import { StandingFields } from "~/components/members/standing-fields";
import { standingText } from "~/components/members/standing-text";
import { Notice } from "~/components/notice";
import { PageTitle } from "~/components/page-title";
import { SubmitButton } from "~/components/submit-button";
import { currentTenant } from "~/organisations/current-tenant.server";
import { changeMember } from "~/organisations/members/change-member.server";
import { findMember, listMembers, type PresentedMember } from "~/organisations/members/list-members.server";
import { memberChangeSchema, standingSchema } from "~/organisations/members/member-schema";
import { grantableRoles, may, type Role } from "~/organisations/permissions";
import { notFound } from "~/services/guard.server";
import { readForm } from "~/services/read-form.server";

export async function loader({ context, params }: Route.LoaderArgs) {
  const { tenant, organisation, actor } = currentTenant(context, "member.manage");
  const member = await findMember(tenant, params.member);
  if (!member) notFound();
  const [members, memos] = await Promise.all([
    listMembers(tenant),
    tenant.memos.count({ originatorId: member.userId }),
  ]);
  return {
    member,
    memos,
    successors: members
      .filter(({ id, suspended }) => id !== member.id && !suspended)
      .map(({ id, name }) => ({ value: id, label: name })),
    isSelf: member.userId === actor.id,
    mayHandOver: may(organisation, "owner.manage"),
    roles: grantableRoles(organisation),
  };
}

export async function action({ request, context, params }: Route.ActionArgs) {
  const { tenant, organisation, actor } = currentTenant(context, "member.manage");
  if (!(await findMember(tenant, params.member))) notFound();
  const submission = await readForm(request, memberChangeSchema);
  if (submission.status !== "success") {
    return data({ refusal: "This form was not complete. Load the page again and try once more.", saved: false }, 400);
  }
  const refusal = await changeMember(tenant, actor.id, params.member, submission.value);
  if (refusal !== null) return data({ refusal, saved: false }, 409);
  const home = `/o/${organisation.slug}`;
  if (submission.value.intent === "remove") throw redirect(`${home}/members?removed`);
  if (submission.value.intent === "hand-over") throw redirect(`${home}/members`);
  return data({ refusal: null, saved: true });
}

/** Its key is the version: after a change it is filled in anew. */
function StandingForm({ member, roles }: { member: PresentedMember; roles: readonly Role[] }) {
  const [form, fields] = useForm({
    id: "standing",
    defaultValue: member,
    onValidate: ({ formData }) => parseWithZod(formData, { schema: standingSchema }),
  });
  return (
    <Form method="post" {...getFormProps(form)} className="grid gap-4">
      <input type="hidden" name="version" value={member.version} />
      <StandingFields fields={fields} roles={roles} />
      <div>
        <SubmitButton busy="Saving…" name="intent" value="change">
          Save
        </SubmitButton>
      </div>
    </Form>
  );
}

export default function Member({ loaderData, actionData }: Route.ComponentProps) {
  const { member, roles, ...steps } = loaderData;
  return (
    <div className="max-w-2xl">
      <title>{`${member.name} · Members · Galeprint`}</title>
      <PageTitle
        first
        actions={
          <Link to=".." relative="path" className="button">
            All members
          </Link>
        }
      >
        {member.name}
      </PageTitle>
      <p className="mb-4 text-slate">
        {member.email} · {standingText(member)} · member since {member.since} UTC
        {member.suspended && <strong> · suspended</strong>}
      </p>
      {actionData?.saved && <Notice>Saved. It holds from their next request on.</Notice>}
      <FormErrors errors={actionData?.refusal ? [actionData.refusal] : null} />
      {member.role === "owner" && !roles.includes("owner") ? (
        <p>Only an owner can change an owner.</p>
      ) : (
        <>
          <StandingForm key={member.version} member={member} roles={roles} />
          <MemberSteps member={member} {...steps} />
        </>
      )}
    </div>
  );
}
