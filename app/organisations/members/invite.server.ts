import { may, type Standing } from "../permissions";
import type { Actor } from "~/context";
import type { Tenant } from "~/db/scoped.server";
import { findOrganisation, peopleById } from "~/db/unscoped.server";
import { prepareToken, revokeTokens } from "~/mail/one-time-token.server";
import { queueMail } from "~/mail/outbox.server";
import type { Transaction } from "sequelize";

const LIFETIME_HOURS = 72;
const HOUR_MS = 60 * 60 * 1000;

interface Inviter {
  actor: Actor;
  standing: Standing;
}

export interface InvitationValues extends Standing {
  addresses: string[];
}

export interface Invited {
  invited: string[];
  /** Belonged to the organisation already. */
  members: string[];
}

const OWNERS_ONLY = "Only an owner can invite an owner.";

function inTransaction(tenant: Tenant): Transaction {
  if (!tenant.transaction) throw new Error("An invitation is written inside a transaction.");
  return tenant.transaction;
}

/** One mail with a link that works once; an earlier link to the same invitation opens nothing from now on. */
async function sendInvitation(inside: Tenant, actor: Actor, id: string, email: string, role: string): Promise<void> {
  const transaction = inTransaction(inside);
  const organisation = await findOrganisation(inside.organisationId);
  const tokenId = await prepareToken("invitation", id, LIFETIME_HOURS * HOUR_MS, transaction);
  const facts = { organisation: organisation?.name ?? "", invitedBy: actor.name, role, hours: LIFETIME_HOURS };
  await queueMail(
    { recipient: email, mail: { template: "invitation", facts }, path: "/invitations/", tokenId },
    transaction,
  );
}

/** Invites everyone who is no member yet; whoever was invited before gets a new mail with what is chosen now. */
export function inviteMembers(
  tenant: Tenant,
  inviter: Inviter,
  values: InvitationValues,
): Promise<Invited | { refusal: string }> {
  const { role, mayCheck, mayIssue } = values;
  return tenant.write(async (inside) => {
    if (role === "owner" && !may(inviter.standing, "owner.manage")) return { refusal: OWNERS_ONLY };
    const memberships = await inside.memberships.list();
    const people = await peopleById(memberships.map(({ userId }) => userId));
    const known = new Set([...people.values()].map(({ email }) => email));
    const expiresAt = new Date(Date.now() + LIFETIME_HOURS * HOUR_MS);
    const offer = { role, mayCheck, mayIssue, invitedBy: inviter.actor.id, expiresAt };
    const invited = values.addresses.filter((address) => !known.has(address));
    for (const email of invited) {
      const pending = await inside.invitations.first({ where: { email } });
      if (pending) await inside.invitations.update(pending.id, offer);
      const { id } = pending ?? (await inside.invitations.create({ email, ...offer }));
      await sendInvitation(inside, inviter.actor, id, email, role);
    }
    return { invited, members: values.addresses.filter((address) => known.has(address)) };
  });
}

/** Sends the mail again with a new link and a new time to answer. @returns the address, or null where there is none */
export function resendInvitation(tenant: Tenant, { actor, standing }: Inviter, id: string): Promise<string | null> {
  return tenant.write(async (inside) => {
    const invitation = await inside.invitations.find(id);
    if (!invitation || (invitation.role === "owner" && !may(standing, "owner.manage"))) return null;
    const expiresAt = new Date(Date.now() + LIFETIME_HOURS * HOUR_MS);
    await inside.invitations.update(id, { expiresAt, invitedBy: actor.id });
    await sendInvitation(inside, actor, id, invitation.email, invitation.role);
    return invitation.email;
  });
}

/** @returns the address, or null where there is no such invitation */
export function revokeInvitation(tenant: Tenant, id: string): Promise<string | null> {
  return tenant.write(async (inside) => {
    const invitation = await inside.invitations.find(id);
    if (!invitation) return null;
    await revokeTokens("invitation", id, inTransaction(inside));
    await inside.invitations.remove({ id });
    return invitation.email;
  });
}
