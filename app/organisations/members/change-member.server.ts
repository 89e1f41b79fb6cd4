import type { MemberChangeForm } from "./member-schema";
import { refusalOf } from "./member-rules";
import type { Membership } from "~/db/models/membership.server";
import type { Tenant } from "~/db/scoped.server";
import { endSessionsOf } from "~/db/unscoped.server";

/** Why it was not done, as a sentence for the form; null when it was. */
export type Refusal = string | null;

const CHANGED_MEANWHILE =
  "Someone else changed this member since you opened this page. Below is how they stand now; decide again.";
const GONE = "You are no longer a member of this organisation.";

async function activeOwners(tenant: Tenant): Promise<number> {
  return tenant.memberships.count({ role: "owner", suspendedAt: null });
}

/**
 * Changes, suspends, restores or removes a member, or hands the ownership to them. Everything is judged inside the
 * writing transaction, so that of two who act at once the second is judged by what the first has done.
 */
export function changeMember(
  tenant: Tenant,
  actorId: string,
  memberId: string,
  form: MemberChangeForm,
): Promise<Refusal> {
  return tenant.write(async (inside) => {
    const actor = await inside.memberships.first({ where: { userId: actorId, suspendedAt: null } });
    if (!actor) return GONE;
    const target = await inside.memberships.find(memberId);
    if (!target || target.version !== form.version) return CHANGED_MEANWHILE;
    const refusal = refusalOf(form.intent === "change" ? { kind: "change", to: form } : { kind: form.intent }, {
      actor,
      isSelf: actor.id === target.id,
      target: { role: target.role, suspended: target.suspendedAt !== null },
      activeOwners: await activeOwners(inside),
    });
    if (refusal !== null) return refusal;
    return apply(inside, actor, target, form);
  });
}

async function apply(inside: Tenant, actor: Membership, target: Membership, form: MemberChangeForm): Promise<Refusal> {
  const version = target.version + 1;
  switch (form.intent) {
    case "change": {
      const { role, mayCheck, mayIssue } = form;
      await inside.memberships.update(target.id, { role, mayCheck, mayIssue, version });
      return null;
    }
    case "suspend":
      await inside.memberships.update(target.id, { suspendedAt: new Date(), version });
      await endSessionsOf(target.userId, inside.transaction);
      return null;
    case "restore":
      await inside.memberships.update(target.id, { suspendedAt: null, version });
      return null;
    case "hand-over":
      await inside.memberships.update(target.id, { role: "owner", version });
      await inside.memberships.update(actor.id, { role: "admin", version: actor.version + 1 });
      return null;
    case "remove":
      return remove(inside, target, form.successor);
  }
}

/** What they made stays and keeps their name; memos that they are the originator of need someone to go on with them. */
async function remove(inside: Tenant, target: Membership, successorId: string | undefined): Promise<Refusal> {
  const memos = await inside.memos.list({ where: { originatorId: target.userId } });
  if (memos.length > 0) {
    const successor = successorId ? await inside.memberships.find(successorId, { where: { suspendedAt: null } }) : null;
    if (!successor || successor.id === target.id) return "Choose who goes on with their memos.";
    for (const memo of memos) {
      // Nobody checks their own memo: where the successor had signed it, the signature goes.
      const unsigned = { checkerId: null, checkedAt: null, checkedContent: null };
      const signature = memo.checkerId === successor.userId ? unsigned : {};
      await inside.memos.update(memo.id, { originatorId: successor.userId, ...signature });
    }
  }
  await inside.memberships.remove({ id: target.id });
  await endSessionsOf(target.userId, inside.transaction);
  return null;
}
