import type { Role } from "../permissions";
import type { Membership } from "~/db/models/membership.server";
import type { Tenant } from "~/db/scoped.server";
import { peopleById } from "~/db/unscoped.server";

export interface PresentedMember {
  id: string;
  userId: string;
  name: string;
  email: string;
  role: Role;
  mayCheck: boolean;
  mayIssue: boolean;
  /** ISO date. */
  since: string;
  suspended: boolean;
  version: number;
}

function day(date: Date): string {
  return date.toISOString().slice(0, 10);
}

async function present(memberships: Membership[]): Promise<PresentedMember[]> {
  const people = await peopleById(memberships.map(({ userId }) => userId));
  return memberships
    .map(({ id, userId, role, mayCheck, mayIssue, createdAt, suspendedAt, version }) => ({
      ...{ id, userId, role, mayCheck, mayIssue, version },
      name: people.get(userId)?.name ?? "",
      email: people.get(userId)?.email ?? "",
      since: day(createdAt),
      suspended: suspendedAt !== null,
    }))
    .sort((a, b) => a.name.localeCompare(b.name));
}

/** Everyone who belongs to the organisation, suspended ones too, by name. */
export async function listMembers(tenant: Tenant): Promise<PresentedMember[]> {
  return present(await tenant.memberships.list());
}

export async function findMember(tenant: Tenant, id: string): Promise<PresentedMember | null> {
  const membership = await tenant.memberships.find(id);
  return membership ? (await present([membership]))[0] : null;
}

export interface PresentedInvitation {
  id: string;
  email: string;
  role: Role;
  mayCheck: boolean;
  mayIssue: boolean;
  invitedBy: string;
  invited: string;
  hasRunOut: boolean;
}

/** Invitations that wait for an answer, the latest first. */
export async function listInvitations(tenant: Tenant): Promise<PresentedInvitation[]> {
  const invitations = await tenant.invitations.list({ order: [["updatedAt", "DESC"]] });
  const people = await peopleById(invitations.map(({ invitedBy }) => invitedBy));
  return invitations.map(({ id, email, role, mayCheck, mayIssue, invitedBy, updatedAt, expiresAt }) => ({
    ...{ id, email, role, mayCheck, mayIssue },
    invitedBy: people.get(invitedBy)?.name ?? "",
    invited: day(updatedAt),
    hasRunOut: expiresAt <= new Date(),
  }));
}
