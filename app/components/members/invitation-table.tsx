import { Form } from "react-router";
import { standingText } from "./standing-text";
import { WideTable } from "~/components/wide-table";
import type { PresentedInvitation } from "~/organisations/members/list-members.server";

const BUTTONS = [
  { intent: "resend", label: "Send again" },
  { intent: "revoke", label: "Revoke" },
];

/** Who was asked and has not answered yet. */
export function InvitationTable({ invitations }: { invitations: PresentedInvitation[] }) {
  return (
    <WideTable label="Invitations">
      <thead>
        <tr>
          <th scope="col">E-mail address</th>
          <th scope="col">As</th>
          <th scope="col">Invited</th>
          <th scope="col">
            <span className="sr-only">Actions</span>
          </th>
        </tr>
      </thead>
      <tbody>
        {invitations.map((invitation) => (
          <tr key={invitation.id}>
            <td className="min-w-44 wrap-anywhere">{invitation.email}</td>
            <td>{standingText(invitation)}</td>
            <td>
              {invitation.invited} UTC by {invitation.invitedBy}
              {invitation.hasRunOut && <strong> · has run out</strong>}
            </td>
            <td>
              <Form method="post" className="flex flex-wrap justify-end gap-2">
                <input type="hidden" name="invitation" value={invitation.id} />
                {BUTTONS.map(({ intent, label }) => (
                  <button
                    key={intent}
                    name="intent"
                    value={intent}
                    className="text-small underline"
                    aria-label={`${label}: ${invitation.email}`}
                  >
                    {label}
                  </button>
                ))}
              </Form>
            </td>
          </tr>
        ))}
      </tbody>
    </WideTable>
  );
}
