/** The one public door to an issued revision. */
import { createCookie, data } from "react-router";
import { hashToken } from "~/db/id.server";
import type { MemoRevision } from "~/db/models/memo-revision.server";
import type { ShareLink } from "~/db/models/share-link.server";
import { forOrganisation } from "~/db/scoped.server";
import { findShareLinkByTokenHash } from "~/db/unscoped.server";
import { supersededBy } from "~/memo/superseded-by.server";

/** Kept out of search engines, caches and the referrer of whatever is clicked next. */
export const SHARE_HEADERS = {
  "Cache-Control": "private, no-store",
  "Referrer-Policy": "no-referrer",
  "X-Robots-Tag": "noindex, nofollow",
};

/** One cookie a link, so that opening a second link does not close the first. */
function shareCookie(linkId: string) {
  return createCookie(`__Host-galeprint-share-${linkId}`, {
    path: "/",
    httpOnly: true,
    secure: true,
    sameSite: "lax",
    maxAge: 60 * 60 * 24,
  });
}

/** The same answer for a link that never was, was revoked or has run out: a stranger learns nothing from it. */
function closed(): never {
  throw data("This link is not valid, or no longer. Ask the people who sent it for a new one.", {
    status: 404,
    headers: SHARE_HEADERS,
  });
}

function isOpen(link: ShareLink, now: Date): boolean {
  return link.revokedAt === null && link.expiresAt > now;
}

/** Exchanges the token of the address for a cookie: the address that stays in the bar holds no secret. */
export async function exchangeToken(token: string): Promise<{ linkId: string; cookie: string }> {
  const link = await findShareLinkByTokenHash(hashToken(token));
  if (!link || !isOpen(link, new Date())) closed();
  return { linkId: link.id, cookie: await shareCookie(link.id).serialize(token) };
}

export interface OpenShare {
  revision: MemoRevision;
  /** Where this revision is no longer the latest. */
  supersededBy: string | null;
}

/** What a link opens, for a browser that holds its cookie; counts the visit. */
export async function openShare(request: Request, linkId: string, act: "opened" | "downloaded"): Promise<OpenShare> {
  const token: unknown = await shareCookie(linkId).parse(request.headers.get("Cookie"));
  const link = typeof token === "string" ? await findShareLinkByTokenHash(hashToken(token)) : null;
  if (!link || link.id !== linkId || !isOpen(link, new Date())) closed();
  const tenant = forOrganisation(link.organisationId);
  const revision = await tenant.memoRevisions.find(link.memoRevisionId);
  if (!revision) closed();
  await tenant.shareVisits.create({ shareLinkId: link.id, act });
  return { revision, supersededBy: await supersededBy(tenant, revision) };
}
