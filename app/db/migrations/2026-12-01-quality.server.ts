import type { Migration } from "./index.server";

/** Both are written once and never changed: what was in force at a run can be told for ever after. */
const TABLES = [
  `CREATE TABLE thresholdSheets (
    id TEXT PRIMARY KEY, organisationId TEXT NOT NULL, projectId TEXT NOT NULL,
    version INTEGER NOT NULL CHECK (version > 0), thresholds JSON NOT NULL, createdBy TEXT NOT NULL REFERENCES users (id),
    createdAt DATETIME NOT NULL, updatedAt DATETIME NOT NULL,
    UNIQUE (organisationId, id), UNIQUE (projectId, version),
    FOREIGN KEY (organisationId, projectId) REFERENCES projects (organisationId, id) ON DELETE CASCADE
  )`,
  `CREATE TABLE flagOverrides (
    id TEXT PRIMARY KEY, organisationId TEXT NOT NULL, recordId TEXT NOT NULL, channel TEXT NOT NULL,
    at REAL NOT NULL, value REAL NOT NULL, flag INTEGER CHECK (flag IN (1, 3, 4)),
    reason TEXT NOT NULL CHECK (length(reason) > 0), createdBy TEXT NOT NULL REFERENCES users (id),
    createdAt DATETIME NOT NULL, updatedAt DATETIME NOT NULL, UNIQUE (organisationId, id),
    FOREIGN KEY (organisationId, recordId) REFERENCES records (organisationId, id) ON DELETE CASCADE
  )`,
];
const APPENDED = ["thresholdSheets", "flagOverrides"];

/** Thresholds of a project, flags set by a person, and what a storm's estimates make of suspect and of missing values. */
export const quality: Migration = {
  name: "2026-12-01-quality",
  async up({ context: { query } }) {
    for (const statement of TABLES) await query(statement);
    await query("CREATE INDEX flagOverridesByRecord ON flagOverrides (recordId)");
    for (const table of APPENDED) {
      await query(
        `CREATE TRIGGER ${table}AreKept BEFORE UPDATE ON ${table} BEGIN SELECT RAISE(ABORT, '${table} are never changed'); END`,
      );
    }
    await query("ALTER TABLE storms ADD COLUMN leaveOutSuspect BOOLEAN NOT NULL DEFAULT 0");
    await query("ALTER TABLE storms ADD COLUMN missingAccepted JSON");
  },
  async down({ context: { query } }) {
    for (const table of [...APPENDED].reverse()) await query(`DROP TABLE ${table}`);
    await query("ALTER TABLE storms DROP COLUMN leaveOutSuspect");
    await query("ALTER TABLE storms DROP COLUMN missingAccepted");
  },
};
