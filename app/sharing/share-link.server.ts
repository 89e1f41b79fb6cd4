import { hashToken, newToken } from "~/db/id.server";
import type { Tenant } from "~/db/scoped.server";
import { config } from "~/services/config.server";

const DAY = 24 * 60 * 60 * 1000;

/** A new door to one revision. The address is told once: only the hash of its token is kept. */
export async function createShareLink(
  tenant: Tenant,
  values: { memoRevisionId: string; recipient: string; days: number; createdBy: string },
): Promise<string> {
  const token = newToken();
  await tenant.shareLinks.create({
    memoRevisionId: values.memoRevisionId,
    recipient: values.recipient,
    tokenHash: hashToken(token),
    expiresAt: new Date(Date.now() + values.days * DAY),
    revokedAt: null,
    createdBy: values.createdBy,
  });
  return `${config().publicUrl}/s/${token}`;
}

/** False where this revision has no such link. Revoking twice keeps the first time. */
export async function revokeShareLink(tenant: Tenant, memoRevisionId: string, id: string): Promise<boolean> {
  const link = await tenant.shareLinks.find(id, { where: { memoRevisionId } });
  if (!link) return false;
  if (link.revokedAt === null) await tenant.shareLinks.update(id, { revokedAt: new Date() });
  return true;
}

export interface PresentedShareLink {
  id: string;
  recipient: string;
  created: string;
  expires: string;
  state: "open" | "revoked" | "run out";
  opened: number;
  downloaded: number;
}

function stateOf(link: { revokedAt: Date | null; expiresAt: Date }): PresentedShareLink["state"] {
  if (link.revokedAt !== null) return "revoked";
  return link.expiresAt > new Date() ? "open" : "run out";
}

export async function listShareLinks(tenant: Tenant, memoRevisionId: string): Promise<PresentedShareLink[]> {
  const links = await tenant.shareLinks.list({ where: { memoRevisionId }, order: [["createdAt", "DESC"]] });
  return Promise.all(
    links.map(async (link) => ({
      id: link.id,
      recipient: link.recipient,
      created: link.createdAt.toISOString(),
      expires: link.expiresAt.toISOString(),
      state: stateOf(link),
      opened: await tenant.shareVisits.count({ shareLinkId: link.id, act: "opened" }),
      downloaded: await tenant.shareVisits.count({ shareLinkId: link.id, act: "downloaded" }),
    })),
  );
}
