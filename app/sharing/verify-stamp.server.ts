import { forOrganisation } from "~/db/scoped.server";
import { findRevisionByStamp } from "~/db/unscoped.server";
import { readStamp } from "~/memo/stamp";
import { supersededBy } from "~/memo/superseded-by.server";
import { formatTime } from "~/units/format-time";

export type StampVerdict =
  /** What was typed cannot be a stamp. */
  | { kind: "misread"; typed: string }
  | { kind: "unknown"; stamp: string }
  | {
      kind: "issued";
      stamp: string;
      organisation: string;
      memoNumber: string;
      revision: string;
      purpose: string;
      /** In UTC. */
      issued: string;
      /** Label of the revision that took this one's place. */
      supersededBy: string | null;
      pdfSha256: string;
    };

/**
 * What anyone who holds a memo may know by its stamp: who issued it, as what, when, whether it still stands, and how its
 * PDF is recognised. Nothing of what it says.
 */
export async function verifyStamp(typed: string): Promise<StampVerdict> {
  const stamp = readStamp(typed);
  if (stamp === null) return { kind: "misread", typed };
  const found = await findRevisionByStamp(stamp);
  if (!found) return { kind: "unknown", stamp };
  const tenant = forOrganisation(found.organisationId);
  const revision = await tenant.memoRevisions.find(found.id, { without: ["pdf"] });
  if (!revision) return { kind: "unknown", stamp };
  const { document, label, purpose, issuedAt, pdfSha256 } = revision;
  return {
    kind: "issued",
    stamp,
    organisation: document.organisation,
    memoNumber: document.titleBlock.memoNumber,
    revision: label,
    purpose,
    issued: formatTime(issuedAt, "UTC"),
    supersededBy: await supersededBy(tenant, revision),
    pdfSha256,
  };
}
