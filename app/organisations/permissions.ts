/** One table of role × action, read by the server's guards, by the screen and by the page that shows it. */

export const ROLES = ["owner", "admin", "consultant", "viewer"] as const;
export type Role = (typeof ROLES)[number];

/** What a member is: a role, and two rights that are given to each member by name. */
export interface Standing {
  role: Role;
  mayCheck: boolean;
  mayIssue: boolean;
}

export const ACTIONS = {
  "project.view": "Open projects, responses and memos; see who is a member",
  "project.edit": "Create and change projects, study boxes, storms and water columns",
  "estimate.run": "Run estimates",
  "memo.write": "Write memos",
  "memo.check": "Sign a memo as its checker",
  "memo.issue": "Issue a revision",
  "memo.share": "Make and revoke share links",
  "project.delete": "Delete a project",
  "organisation.manage": "Change the organisation's settings",
  "member.manage": "Invite, suspend and remove members, change their roles and rights",
  "owner.manage": "Make, change and remove owners; hand over the ownership",
} as const;
export type Action = keyof typeof ACTIONS;

const CONSULTANT: Action[] = ["project.view", "project.edit", "estimate.run", "memo.write", "memo.share"];
const ADMIN: Action[] = [...CONSULTANT, "project.delete", "organisation.manage", "member.manage"];

const ALLOWED: Record<Role, readonly Action[]> = {
  owner: [...ADMIN, "owner.manage"],
  admin: ADMIN,
  consultant: CONSULTANT,
  viewer: ["project.view"],
};

/** Signatures are a person's, not a role's. */
const BY_RIGHT: Partial<Record<Action, "mayCheck" | "mayIssue">> = {
  "memo.check": "mayCheck",
  "memo.issue": "mayIssue",
};

export function may(member: Standing, action: Action): boolean {
  const right = BY_RIGHT[action];
  return right === undefined ? ALLOWED[member.role].includes(action) : member[right];
}

/** What a member of a role is given until somebody decides otherwise. */
export function usualStanding(role: Role): Standing {
  return { role, mayCheck: role !== "viewer", mayIssue: role !== "viewer" };
}

/** The roles that a member may give to others. */
export function grantableRoles(member: Standing): Role[] {
  return ROLES.filter((role) => role !== "owner" || may(member, "owner.manage"));
}

interface RightsRow {
  action: Action;
  label: string;
  /** In the order of `ROLES`. */
  answers: ("yes" | "no" | "by right")[];
}

/** The table as it is enforced. */
export function rightsTable(): RightsRow[] {
  return (Object.keys(ACTIONS) as Action[]).map((action) => ({
    action,
    label: ACTIONS[action],
    answers: ROLES.map((role) => {
      if (BY_RIGHT[action] !== undefined) return "by right";
      return ALLOWED[role].includes(action) ? "yes" : "no";
    }),
  }));
}
