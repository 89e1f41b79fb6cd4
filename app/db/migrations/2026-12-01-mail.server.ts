import type { Migration } from "./index.server";

const TABLES = [
  `CREATE TABLE oneTimeTokens (
    id TEXT PRIMARY KEY, purpose TEXT NOT NULL CHECK (purpose IN ('invitation', 'confirm-address', 'reset-password')),
    subjectId TEXT NOT NULL, tokenHash TEXT UNIQUE, expiresAt DATETIME NOT NULL, usedAt DATETIME,
    createdAt DATETIME NOT NULL, updatedAt DATETIME NOT NULL
  )`,
  `CREATE TABLE outboxMails (
    id TEXT PRIMARY KEY, recipient TEXT NOT NULL, mail JSON NOT NULL, path TEXT NOT NULL,
    tokenId TEXT REFERENCES oneTimeTokens (id) ON DELETE CASCADE,
    state TEXT NOT NULL CHECK (state IN ('waiting', 'sent', 'failed', 'dropped')),
    attempts INTEGER NOT NULL, dueAt DATETIME NOT NULL, lastError TEXT,
    createdAt DATETIME NOT NULL, updatedAt DATETIME NOT NULL
  )`,
  "CREATE INDEX oneTimeTokensBySubject ON oneTimeTokens (purpose, subjectId)",
  "CREATE INDEX outboxMailsByTurn ON outboxMails (state, dueAt)",
];

/** Mail that waits to be sent, and the tokens of links that work once. */
export const mail: Migration = {
  name: "2026-12-01-mail",
  async up({ context: { query } }) {
    for (const statement of TABLES) await query(statement);
  },
  async down({ context: { query } }) {
    await query("DROP TABLE outboxMails");
    await query("DROP TABLE oneTimeTokens");
  },
};
