/**
 * Look-ups that come before an organisation is known: who signs in, which organisations a person belongs to,
 * what a share link opens, what a stamp stands for, which estimates wait for a worker. Each returns the organisation with what it found,
 * so that everything after goes through `forOrganisation`.
 */
import type { Transaction } from "sequelize";
import { newId } from "./id.server";
import { Estimate } from "./models/estimate.server";
import { Invitation } from "./models/invitation.server";
import { Membership } from "./models/membership.server";
import { MemoRevision } from "./models/memo-revision.server";
import { Organisation } from "./models/organisation.server";
import { Session } from "./models/session.server";
import { ShareLink } from "./models/share-link.server";
import { User } from "./models/user.server";
import type { Standing } from "~/organisations/permissions";

export async function findUserByEmail(email: string, transaction?: Transaction): Promise<User | null> {
  return User.findOne({ where: { email }, transaction });
}

export async function findUser(id: string): Promise<User | null> {
  return User.findByPk(id);
}

export async function createUser(
  values: { email: string; name: string; passwordHash: string; emailConfirmedAt?: Date },
  transaction: Transaction,
): Promise<User> {
  return User.create({ id: newId(), ...values }, { transaction });
}

export async function createOrganisation(
  values: Pick<Organisation, "slug" | "name" | "units" | "paperSize">,
  transaction: Transaction,
): Promise<Organisation> {
  return Organisation.create({ id: newId(), ...values }, { transaction });
}

export async function updateOrganisation(
  id: string,
  values: Pick<Organisation, "name" | "units" | "paperSize">,
): Promise<void> {
  await Organisation.update(values, { where: { id } });
}

export async function slugIsTaken(slug: string, transaction?: Transaction): Promise<boolean> {
  return (await Organisation.count({ where: { slug }, transaction })) > 0;
}

export interface OrganisationOfUser {
  organisation: Organisation;
  standing: Standing;
}

function standingOf({ role, mayCheck, mayIssue }: Membership): Standing {
  return { role, mayCheck, mayIssue };
}

export async function organisationsOfUser(userId: string): Promise<OrganisationOfUser[]> {
  const memberships = await Membership.findAll({ where: { userId, suspendedAt: null } });
  const found = await Promise.all(
    memberships.map(async (membership) => ({
      organisation: await Organisation.findByPk(membership.organisationId),
      standing: standingOf(membership),
    })),
  );
  return found
    .filter((entry): entry is OrganisationOfUser => entry.organisation !== null)
    .sort((a, b) => a.organisation.name.localeCompare(b.organisation.name));
}

export async function membershipBySlug(userId: string, slug: string): Promise<OrganisationOfUser | null> {
  const organisation = await Organisation.findOne({ where: { slug } });
  if (!organisation) return null;
  const membership = await Membership.findOne({
    where: { userId, organisationId: organisation.id, suspendedAt: null },
  });
  return membership && { organisation, standing: standingOf(membership) };
}

/** What an invitation's link stands for; the invitation leads to its organisation. */
export async function findInvitation(id: string, transaction?: Transaction): Promise<Invitation | null> {
  return Invitation.findByPk(id, { transaction });
}

export async function findOrganisation(id: string): Promise<Organisation | null> {
  return Organisation.findByPk(id);
}

export async function setPassword(userId: string, passwordHash: string, transaction: Transaction): Promise<void> {
  await User.update({ passwordHash }, { where: { id: userId }, transaction });
}

/** Signs a person out everywhere, at once. */
export async function endSessionsOf(userId: string, transaction?: Transaction): Promise<void> {
  await Session.destroy({ where: { userId }, transaction });
}

/** Names and addresses of people, by id. */
export async function peopleById(ids: string[]): Promise<Map<string, Pick<User, "name" | "email">>> {
  const users = await User.findAll({ where: { id: ids }, attributes: ["id", "name", "email"] });
  return new Map(users.map((user) => [user.id, user]));
}

/** Names of people who wrote, checked or ran something. */
export async function namesOfUsers(ids: Iterable<string>): Promise<Map<string, string>> {
  const users = await User.findAll({ where: { id: [...new Set(ids)] }, attributes: ["id", "name"] });
  return new Map(users.map(({ id, name }) => [id, name]));
}

export async function findShareLinkByTokenHash(tokenHash: string): Promise<ShareLink | null> {
  return ShareLink.findOne({ where: { tokenHash } });
}

export async function findRevisionByStamp(stamp: string): Promise<{ organisationId: string; id: string } | null> {
  return MemoRevision.findOne({ where: { stamp }, attributes: ["organisationId", "id"] });
}

/** What a stopped server left unfinished, oldest first. */
export async function unfinishedEstimates(): Promise<{ organisationId: string; id: string }[]> {
  return Estimate.findAll({
    where: { state: ["queued", "running"] },
    order: [["updatedAt", "ASC"]],
    attributes: ["organisationId", "id"],
  });
}
