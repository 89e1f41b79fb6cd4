/** One table of role × action, read by the server's guards and by the screen alike. */

export const ROLES = ["owner", "admin", "consultant", "viewer"] as const;
export type Role = (typeof ROLES)[number];

export const ACTIONS = {
  "project.view": "Open projects, responses and memos",
  "project.edit": "Create and change projects, study boxes, storms and water columns",
  "estimate.run": "Run estimates",
  "memo.write": "Write memos",
  "memo.check": "Sign a memo as its checker",
  "memo.issue": "Issue a revision",
  "memo.share": "Make and revoke share links",
  "project.delete": "Delete a project",
  "organisation.manage": "Change the organisation's settings",
} as const;
export type Action = keyof typeof ACTIONS;

const CONSULTANT: Action[] = [
  "project.view",
  "project.edit",
  "estimate.run",
  "memo.write",
  "memo.check",
  "memo.issue",
  "memo.share",
];
const ADMIN: Action[] = [...CONSULTANT, "project.delete", "organisation.manage"];

const ALLOWED: Record<Role, readonly Action[]> = {
  owner: ADMIN,
  admin: ADMIN,
  consultant: CONSULTANT,
  viewer: ["project.view"],
};

export function may(role: Role, action: Action): boolean {
  return ALLOWED[role].includes(action);
}
