import type { Standing } from "../permissions";
import { inWriteTransaction } from "~/db/connection.server";
import type { Invitation } from "~/db/models/invitation.server";
import { forOrganisation } from "~/db/scoped.server";
import { createUser, findInvitation, findOrganisation, findUserByEmail, peopleById } from "~/db/unscoped.server";
import { spendToken, subjectOfToken } from "~/mail/one-time-token.server";
import { hashPassword } from "~/services/password.server";
import type { Transaction } from "sequelize";

export interface OpenInvitation {
  email: string;
  organisation: string;
  slug: string;
  role: Standing["role"];
  invitedBy: string;
  /** Whether the address has an account. Only who can read its mail learns this. */
  hasAccount: boolean;
}

/** What a link offers, while it is good; null where it is not. Looking does not use it up. */
export async function openInvitation(token: string): Promise<OpenInvitation | null> {
  const id = await subjectOfToken("invitation", token);
  const invitation = id === null ? null : await findInvitation(id);
  const organisation = invitation && (await findOrganisation(invitation.organisationId));
  if (!invitation || !organisation) return null;
  const [inviter, account] = await Promise.all([peopleById([invitation.invitedBy]), findUserByEmail(invitation.email)]);
  return {
    email: invitation.email,
    organisation: organisation.name,
    slug: organisation.slug,
    role: invitation.role,
    invitedBy: inviter.get(invitation.invitedBy)?.name ?? "",
    hasAccount: account !== null,
  };
}

/** Uses the link up and gives the invitation that it stood for. */
async function takeInvitation(token: string, transaction: Transaction): Promise<Invitation | null> {
  const id = await spendToken("invitation", token, transaction);
  return id === null ? null : findInvitation(id, transaction);
}

async function join(invitation: Invitation, userId: string, transaction: Transaction): Promise<string> {
  const tenant = forOrganisation(invitation.organisationId, transaction);
  const { role, mayCheck, mayIssue } = invitation;
  if (!(await tenant.memberships.first({ where: { userId } }))) {
    await tenant.memberships.create({ userId, role, mayCheck, mayIssue });
  }
  await tenant.invitations.remove({ id: invitation.id });
  return invitation.organisationId;
}

async function addressOf(organisationId: string | null): Promise<string | null> {
  const organisation = organisationId === null ? null : await findOrganisation(organisationId);
  return organisation && `/o/${organisation.slug}`;
}

/** Someone who has an account and is signed in with the invited address. @returns where to go on, or null */
export async function acceptAsUser(token: string, user: { id: string; email: string }): Promise<string | null> {
  const organisationId = await inWriteTransaction(async (transaction) => {
    const id = await subjectOfToken("invitation", token);
    const offered = id === null ? null : await findInvitation(id, transaction);
    if (offered?.email !== user.email) return null;
    const invitation = await takeInvitation(token, transaction);
    return invitation && join(invitation, user.id, transaction);
  });
  return addressOf(organisationId);
}

/** Someone new: the link has shown that the address is theirs. @returns their id and where to go on, or null */
export async function acceptAsNewcomer(
  token: string,
  { name, password }: { name: string; password: string },
): Promise<{ userId: string; to: string } | null> {
  const passwordHash = await hashPassword(password);
  const joined = await inWriteTransaction(async (transaction) => {
    const id = await subjectOfToken("invitation", token);
    const offered = id === null ? null : await findInvitation(id, transaction);
    // Looked at before the link is used up: who has an account goes on to sign in with the same link.
    if (!offered || (await findUserByEmail(offered.email, transaction))) return null;
    const invitation = await takeInvitation(token, transaction);
    if (!invitation) return null;
    const { email } = invitation;
    const user = await createUser({ email, name, passwordHash, emailConfirmedAt: new Date() }, transaction);
    return { userId: user.id, organisationId: await join(invitation, user.id, transaction) };
  });
  const to = joined && (await addressOf(joined.organisationId));
  return joined && to !== null ? { userId: joined.userId, to } : null;
}
