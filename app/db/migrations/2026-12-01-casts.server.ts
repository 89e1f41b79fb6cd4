import type { Migration } from "./index.server";

const TABLE = `CREATE TABLE casts (
  id TEXT PRIMARY KEY, organisationId TEXT NOT NULL, projectId TEXT NOT NULL, sourceFileId TEXT NOT NULL,
  waterColumnId TEXT, name TEXT NOT NULL, origin TEXT NOT NULL CHECK (origin IN ('file', 'pasted')),
  answers JSON NOT NULL, provenance JSON, length INTEGER NOT NULL CHECK (length >= 0),
  depth BLOB, temperature BLOB, salinity BLOB, createdBy TEXT NOT NULL REFERENCES users (id),
  createdAt DATETIME NOT NULL, updatedAt DATETIME NOT NULL,
  UNIQUE (organisationId, id), UNIQUE (waterColumnId),
  FOREIGN KEY (organisationId, projectId) REFERENCES projects (organisationId, id) ON DELETE CASCADE,
  FOREIGN KEY (organisationId, sourceFileId) REFERENCES sourceFiles (organisationId, id),
  FOREIGN KEY (organisationId, waterColumnId) REFERENCES waterColumns (organisationId, id) ON DELETE CASCADE
)`;

/** Files with casts: each waits for its sheet to be confirmed, then stands behind a water column. */
export const casts: Migration = {
  name: "2026-12-01-casts",
  async up({ context: { query } }) {
    await query(TABLE);
  },
  async down({ context: { query } }) {
    await query("DROP TABLE casts");
  },
};
