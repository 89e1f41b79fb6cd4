import { may, type Role, type Standing } from "../permissions";

/** What someone is about to do to a member. */
export type MemberChange =
  | { kind: "change"; to: Standing }
  | { kind: "suspend" }
  | { kind: "restore" }
  | { kind: "remove" }
  | { kind: "hand-over" };

export interface MemberSituation {
  actor: Standing;
  isSelf: boolean;
  target: { role: Role; suspended: boolean };
  /** Owners of the organisation who are not suspended, the target among them where they are one. */
  activeOwners: number;
}

const OWNERS_ONLY = "Only an owner can make, change or remove an owner.";
const LAST_OWNER = "This is the last owner. Make someone else an owner first, or hand over the ownership.";

/** Why a change may not be made, as a sentence for the form, or null. */
export function refusalOf(
  change: MemberChange,
  { actor, isSelf, target, activeOwners }: MemberSituation,
): string | null {
  if (change.kind === "hand-over") {
    if (!may(actor, "owner.manage")) return OWNERS_ONLY;
    if (isSelf) return "You are an owner already. Choose another member.";
    return target.suspended ? "This member is suspended. Restore them first." : null;
  }
  const touchesOwner = target.role === "owner" || (change.kind === "change" && change.to.role === "owner");
  if (touchesOwner && !may(actor, "owner.manage")) return OWNERS_ONLY;
  const staysActiveOwner = change.kind === "restore" || (change.kind === "change" && change.to.role === "owner");
  if (target.role === "owner" && !target.suspended && !staysActiveOwner && activeOwners <= 1) return LAST_OWNER;
  if (isSelf && change.kind === "suspend") return "You cannot suspend yourself.";
  return null;
}
