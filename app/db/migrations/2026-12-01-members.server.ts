import type { Migration } from "./index.server";

const INVITATIONS = `CREATE TABLE invitations (
  id TEXT PRIMARY KEY, organisationId TEXT NOT NULL REFERENCES organisations (id) ON DELETE CASCADE,
  email TEXT NOT NULL, role TEXT NOT NULL CHECK (role IN ('owner', 'admin', 'consultant', 'viewer')),
  mayCheck BOOLEAN NOT NULL, mayIssue BOOLEAN NOT NULL, invitedBy TEXT NOT NULL REFERENCES users (id),
  expiresAt DATETIME NOT NULL, createdAt DATETIME NOT NULL, updatedAt DATETIME NOT NULL,
  UNIQUE (organisationId, id), UNIQUE (organisationId, email)
)`;

const MEMBERSHIP_COLUMNS = [
  "mayCheck BOOLEAN NOT NULL DEFAULT 0",
  "mayIssue BOOLEAN NOT NULL DEFAULT 0",
  "suspendedAt DATETIME",
  "version INTEGER NOT NULL DEFAULT 1",
];

/** Invitations; rights to check and to issue, suspension and a version of each member; addresses that were confirmed. */
export const members: Migration = {
  name: "2026-12-01-members",
  async up({ context: { query } }) {
    await query(INVITATIONS);
    for (const column of MEMBERSHIP_COLUMNS) await query(`ALTER TABLE memberships ADD COLUMN ${column}`);
    // Whoever could sign and issue until now still can.
    await query("UPDATE memberships SET mayCheck = 1, mayIssue = 1 WHERE role <> 'viewer'");
    await query("ALTER TABLE users ADD COLUMN emailConfirmedAt DATETIME");
  },
  async down({ context: { query } }) {
    await query("ALTER TABLE users DROP COLUMN emailConfirmedAt");
    for (const column of [...MEMBERSHIP_COLUMNS].reverse()) {
      await query(`ALTER TABLE memberships DROP COLUMN ${column.split(" ", 1)[0]}`);
    }
    await query("DROP TABLE invitations");
  },
};
