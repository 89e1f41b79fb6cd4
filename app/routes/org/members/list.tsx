import { data, Link, useSearchParams } from "react-router";
import type { Route } from "./+types/list";
import { InvitationTable } from "~/components/members/invitation-table";
import { InviteForm } from "~/components/members/invite-form";
import { standingText } from "~/components/members/standing-text";
import { Notice } from "~/components/notice";
import { PageTitle } from "~/components/page-title";
import { SectionHeading } from "~/components/section-heading";
import { WideTable } from "~/components/wide-table";
import { mailIsSetUp } from "~/mail/send-mail.server";
import { currentTenant } from "~/organisations/current-tenant.server";
import { inviteMembers, resendInvitation, revokeInvitation } from "~/organisations/members/invite.server";
import { listInvitations, listMembers } from "~/organisations/members/list-members.server";
import { invitationSchema } from "~/organisations/members/member-schema";
import { grantableRoles, may } from "~/organisations/permissions";
import { readForm } from "~/services/read-form.server";

export async function loader({ context }: Route.LoaderArgs) {
  const { tenant, organisation } = currentTenant(context, "project.view");
  const mayManage = may(organisation, "member.manage");
  return {
    members: await listMembers(tenant),
    invitations: mayManage ? await listInvitations(tenant) : [],
    mayManage,
    roles: grantableRoles(organisation),
    sendsMail: mailIsSetUp(),
  };
}

export async function action({ request, context }: Route.ActionArgs) {
  const { tenant, organisation, actor } = currentTenant(context, "member.manage");
  const inviter = { actor, standing: organisation };
  const form = await request.clone().formData();
  const id = String(form.get("invitation") ?? "");
  switch (form.get("intent")) {
    case "resend": {
      const email = await resendInvitation(tenant, inviter, id);
      return done(email && `A new invitation is on its way to ${email}. The link of the earlier mail no longer works.`);
    }
    case "revoke": {
      const email = await revokeInvitation(tenant, id);
      return done(email && `The invitation of ${email} is revoked. Its link no longer works.`);
    }
    default: {
      const submission = await readForm(request, invitationSchema);
      if (submission.status !== "success") return data({ result: submission.reply(), notice: null }, { status: 400 });
      const outcome = await inviteMembers(tenant, inviter, submission.value);
      if ("refusal" in outcome) {
        const result = submission.reply({ fieldErrors: { role: [outcome.refusal] } });
        return data({ result, notice: null }, { status: 400 });
      }
      return data({ result: submission.reply({ resetForm: true }), notice: whatWasDone(outcome) });
    }
  }
}

function done(notice: string | null) {
  if (notice !== null) return data({ result: undefined, notice });
  const gone = "This invitation is no longer there: it was accepted or revoked, or it is an owner’s to change.";
  return data({ result: undefined, notice: gone }, { status: 409 });
}

function whatWasDone({ invited, members }: { invited: string[]; members: string[] }): string {
  const asked = invited.length === 0 ? "Nobody new was invited." : `Invited: ${invited.join(", ")}.`;
  return members.length === 0 ? asked : `${asked} Members already: ${members.join(", ")}.`;
}

export default function Members({ loaderData, actionData }: Route.ComponentProps) {
  const { members, invitations, mayManage, roles, sendsMail } = loaderData;
  const [search] = useSearchParams();
  return (
    <>
      <title>Members · Galeprint</title>
      <PageTitle
        first
        actions={
          <Link to="roles" className="button">
            What each role may do
          </Link>
        }
      >
        Members
      </PageTitle>
      {search.has("removed") && <Notice>The member was removed, and their sign-ins have ended.</Notice>}
      {actionData?.notice && <Notice>{actionData.notice}</Notice>}
      <WideTable label="Members">
        <thead>
          <tr>
            <th scope="col">Name</th>
            <th scope="col">E-mail address</th>
            <th scope="col">Role and rights</th>
            <th scope="col">Member since (UTC)</th>
          </tr>
        </thead>
        <tbody>
          {members.map((member) => (
            <tr key={member.id}>
              <td>
                {mayManage ? (
                  <Link to={member.id} className="font-bold underline">
                    {member.name}
                  </Link>
                ) : (
                  member.name
                )}
              </td>
              <td className="min-w-44 wrap-anywhere">{member.email}</td>
              <td>
                {standingText(member)}
                {member.suspended && <strong> · suspended</strong>}
              </td>
              <td className="whitespace-nowrap tabular-nums">{member.since}</td>
            </tr>
          ))}
        </tbody>
      </WideTable>
      {mayManage && (
        <>
          {invitations.length > 0 && (
            <>
              <SectionHeading>Invitations without an answer</SectionHeading>
              <InvitationTable invitations={invitations} />
            </>
          )}
          <SectionHeading>Invite people</SectionHeading>
          {!sendsMail && (
            <Notice>
              This server sends no mail yet. Invitations wait until its operator has set SMTP_URL, and run out after
              three days.
            </Notice>
          )}
          <InviteForm lastResult={actionData?.result} roles={roles} />
        </>
      )}
    </>
  );
}
