import type { Standing } from "~/organisations/permissions";

/** A role with its rights, in a few words: "consultant, may check". */
export function standingText({ role, mayCheck, mayIssue }: Standing): string {
  const rights = [...(mayCheck ? ["check"] : []), ...(mayIssue ? ["issue"] : [])];
  return rights.length === 0 ? role : `${role}, may ${rights.join(" and ")}`;
}
