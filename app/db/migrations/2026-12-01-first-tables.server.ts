import type { Migration } from "./index.server";

/**
 * A tenant's table carries its organisation and refers to its parents by (organisationId, id):
 * a row of one organisation cannot hang under a row of another, whatever the code above does.
 * Not STRICT: Sequelize reads DATETIME and JSON back by the declared type, which STRICT does not allow.
 */
const TABLES = [
  `CREATE TABLE users (
    id TEXT PRIMARY KEY, email TEXT NOT NULL UNIQUE, name TEXT NOT NULL, passwordHash TEXT NOT NULL,
    createdAt DATETIME NOT NULL, updatedAt DATETIME NOT NULL
  )`,
  `CREATE TABLE organisations (
    id TEXT PRIMARY KEY, slug TEXT NOT NULL UNIQUE, name TEXT NOT NULL,
    units JSON NOT NULL, paperSize TEXT NOT NULL CHECK (paperSize IN ('A4', 'Letter')),
    createdAt DATETIME NOT NULL, updatedAt DATETIME NOT NULL
  )`,
  `CREATE TABLE memberships (
    id TEXT PRIMARY KEY, organisationId TEXT NOT NULL REFERENCES organisations (id) ON DELETE CASCADE,
    userId TEXT NOT NULL REFERENCES users (id) ON DELETE CASCADE,
    role TEXT NOT NULL CHECK (role IN ('owner', 'admin', 'consultant', 'viewer')),
    createdAt DATETIME NOT NULL, updatedAt DATETIME NOT NULL,
    UNIQUE (organisationId, userId), UNIQUE (organisationId, id)
  )`,
  `CREATE TABLE sessions (
    id TEXT PRIMARY KEY, userId TEXT NOT NULL REFERENCES users (id) ON DELETE CASCADE,
    lastSeenAt DATETIME NOT NULL, expiresAt DATETIME NOT NULL, createdAt DATETIME NOT NULL, updatedAt DATETIME NOT NULL
  )`,
  `CREATE TABLE projects (
    id TEXT PRIMARY KEY, organisationId TEXT NOT NULL REFERENCES organisations (id) ON DELETE CASCADE,
    name TEXT NOT NULL, jobNumber TEXT NOT NULL, client TEXT NOT NULL, timeZone TEXT NOT NULL,
    cautionsAcceptedAt DATETIME NOT NULL, cautionsAcceptedBy TEXT NOT NULL REFERENCES users (id),
    createdAt DATETIME NOT NULL, updatedAt DATETIME NOT NULL,
    UNIQUE (organisationId, id), UNIQUE (organisationId, jobNumber)
  )`,
  `CREATE TABLE studyBoxes (
    id TEXT PRIMARY KEY, organisationId TEXT NOT NULL, projectId TEXT NOT NULL,
    name TEXT NOT NULL, polygon JSON NOT NULL, waterDepth REAL, shoreNormal REAL, distanceToShore REAL,
    landShare REAL, triggerLevels JSON NOT NULL,
    createdAt DATETIME NOT NULL, updatedAt DATETIME NOT NULL,
    UNIQUE (organisationId, id), UNIQUE (projectId, name),
    FOREIGN KEY (organisationId, projectId) REFERENCES projects (organisationId, id) ON DELETE CASCADE
  )`,
  `CREATE TABLE storms (
    id TEXT PRIMARY KEY, organisationId TEXT NOT NULL, projectId TEXT NOT NULL,
    name TEXT NOT NULL, startsAt REAL, endsAt REAL,
    createdAt DATETIME NOT NULL, updatedAt DATETIME NOT NULL,
    UNIQUE (organisationId, id), UNIQUE (projectId, name), CHECK (endsAt > startsAt),
    FOREIGN KEY (organisationId, projectId) REFERENCES projects (organisationId, id) ON DELETE CASCADE
  )`,
  `CREATE TABLE sourceFiles (
    id TEXT PRIMARY KEY, organisationId TEXT NOT NULL, projectId TEXT NOT NULL,
    name TEXT NOT NULL, sha256 TEXT NOT NULL, size INTEGER NOT NULL, bytes BLOB NOT NULL,
    uploadedBy TEXT NOT NULL REFERENCES users (id), createdAt DATETIME NOT NULL, updatedAt DATETIME NOT NULL,
    UNIQUE (organisationId, id), UNIQUE (projectId, sha256),
    FOREIGN KEY (organisationId, projectId) REFERENCES projects (organisationId, id) ON DELETE CASCADE
  )`,
  `CREATE TABLE records (
    id TEXT PRIMARY KEY, organisationId TEXT NOT NULL, stormId TEXT NOT NULL, sourceFileId TEXT,
    name TEXT NOT NULL, origin TEXT NOT NULL CHECK (origin IN ('file', 'pasted', 'constant')),
    state TEXT NOT NULL CHECK (state IN ('reading', 'confirmed')), answers JSON NOT NULL, provenance JSON,
    createdBy TEXT NOT NULL REFERENCES users (id), createdAt DATETIME NOT NULL, updatedAt DATETIME NOT NULL,
    UNIQUE (organisationId, id),
    FOREIGN KEY (organisationId, stormId) REFERENCES storms (organisationId, id) ON DELETE CASCADE,
    FOREIGN KEY (organisationId, sourceFileId) REFERENCES sourceFiles (organisationId, id)
  )`,
  `CREATE TABLE series (
    id TEXT PRIMARY KEY, organisationId TEXT NOT NULL, stormId TEXT NOT NULL, recordId TEXT NOT NULL,
    channel TEXT NOT NULL, unit TEXT NOT NULL, length INTEGER NOT NULL CHECK (length > 0),
    time BLOB NOT NULL, "values" BLOB NOT NULL,
    createdAt DATETIME NOT NULL, updatedAt DATETIME NOT NULL,
    UNIQUE (organisationId, id), UNIQUE (stormId, channel),
    FOREIGN KEY (organisationId, stormId) REFERENCES storms (organisationId, id) ON DELETE CASCADE,
    FOREIGN KEY (organisationId, recordId) REFERENCES records (organisationId, id) ON DELETE CASCADE
  )`,
  `CREATE TABLE waterColumns (
    id TEXT PRIMARY KEY, organisationId TEXT NOT NULL, projectId TEXT NOT NULL,
    name TEXT NOT NULL, source TEXT NOT NULL, temperature REAL NOT NULL, salinity REAL NOT NULL,
    salinityScale TEXT NOT NULL CHECK (salinityScale IN ('absolute', 'practical')), layerDepth REAL NOT NULL,
    belowTemperature REAL, belowSalinity REAL,
    createdAt DATETIME NOT NULL, updatedAt DATETIME NOT NULL,
    UNIQUE (organisationId, id), UNIQUE (projectId, name),
    FOREIGN KEY (organisationId, projectId) REFERENCES projects (organisationId, id) ON DELETE CASCADE
  )`,
  `CREATE TABLE methodSheets (
    id TEXT PRIMARY KEY, organisationId TEXT NOT NULL REFERENCES organisations (id) ON DELETE CASCADE,
    name TEXT NOT NULL, version INTEGER NOT NULL CHECK (version > 0), choices JSON NOT NULL,
    createdAt DATETIME NOT NULL, updatedAt DATETIME NOT NULL,
    UNIQUE (organisationId, id), UNIQUE (organisationId, name, version)
  )`,
  `CREATE TABLE estimates (
    id TEXT PRIMARY KEY, organisationId TEXT NOT NULL, projectId TEXT NOT NULL, number INTEGER NOT NULL,
    studyBoxId TEXT NOT NULL, stormId TEXT NOT NULL, waterColumnId TEXT NOT NULL, methodSheetId TEXT NOT NULL,
    state TEXT NOT NULL CHECK (state IN ('queued', 'running', 'done', 'failed')), problems JSON,
    inputHash TEXT, engineVersion TEXT, requestedBy TEXT NOT NULL REFERENCES users (id),
    startedAt DATETIME, finishedAt DATETIME, createdAt DATETIME NOT NULL, updatedAt DATETIME NOT NULL,
    UNIQUE (organisationId, id), UNIQUE (projectId, number), UNIQUE (studyBoxId, stormId),
    FOREIGN KEY (organisationId, projectId) REFERENCES projects (organisationId, id) ON DELETE CASCADE,
    FOREIGN KEY (organisationId, studyBoxId) REFERENCES studyBoxes (organisationId, id) ON DELETE CASCADE,
    FOREIGN KEY (organisationId, stormId) REFERENCES storms (organisationId, id) ON DELETE CASCADE,
    FOREIGN KEY (organisationId, waterColumnId) REFERENCES waterColumns (organisationId, id) ON DELETE CASCADE,
    FOREIGN KEY (organisationId, methodSheetId) REFERENCES methodSheets (organisationId, id)
  )`,
  `CREATE TABLE results (
    id TEXT PRIMARY KEY, organisationId TEXT NOT NULL REFERENCES organisations (id) ON DELETE CASCADE,
    inputHash TEXT NOT NULL, engineVersion TEXT NOT NULL, response JSON NOT NULL,
    length INTEGER NOT NULL CHECK (length > 0), time BLOB NOT NULL,
    createdAt DATETIME NOT NULL, updatedAt DATETIME NOT NULL,
    UNIQUE (organisationId, id), UNIQUE (organisationId, inputHash, engineVersion)
  )`,
  `CREATE TABLE resultSeries (
    id TEXT PRIMARY KEY, organisationId TEXT NOT NULL, resultId TEXT NOT NULL, name TEXT NOT NULL, unit TEXT NOT NULL,
    length INTEGER NOT NULL CHECK (length > 0), "values" BLOB NOT NULL,
    createdAt DATETIME NOT NULL, updatedAt DATETIME NOT NULL, UNIQUE (resultId, name),
    FOREIGN KEY (organisationId, resultId) REFERENCES results (organisationId, id) ON DELETE CASCADE
  )`,
  `CREATE TABLE memos (
    id TEXT PRIMARY KEY, organisationId TEXT NOT NULL, projectId TEXT NOT NULL, number INTEGER NOT NULL,
    title TEXT NOT NULL, question TEXT NOT NULL, findings TEXT NOT NULL, purpose TEXT NOT NULL,
    originatorId TEXT NOT NULL REFERENCES users (id),
    checkerId TEXT REFERENCES users (id), checkedAt DATETIME, checkedContent TEXT,
    createdAt DATETIME NOT NULL, updatedAt DATETIME NOT NULL,
    UNIQUE (organisationId, id), UNIQUE (projectId, number), CHECK (checkerId <> originatorId),
    FOREIGN KEY (organisationId, projectId) REFERENCES projects (organisationId, id) ON DELETE CASCADE
  )`,
  `CREATE TABLE memoEstimates (
    id TEXT PRIMARY KEY, organisationId TEXT NOT NULL, memoId TEXT NOT NULL, estimateId TEXT NOT NULL,
    position INTEGER NOT NULL, createdAt DATETIME NOT NULL, updatedAt DATETIME NOT NULL, UNIQUE (memoId, estimateId),
    FOREIGN KEY (organisationId, memoId) REFERENCES memos (organisationId, id) ON DELETE CASCADE,
    FOREIGN KEY (organisationId, estimateId) REFERENCES estimates (organisationId, id) ON DELETE CASCADE
  )`,
  `CREATE TABLE memoRevisions (
    id TEXT PRIMARY KEY, organisationId TEXT NOT NULL, memoId TEXT NOT NULL, sequence INTEGER NOT NULL,
    label TEXT NOT NULL, purpose TEXT NOT NULL, document JSON NOT NULL, stamp TEXT NOT NULL UNIQUE,
    pdf BLOB NOT NULL, pdfSha256 TEXT NOT NULL, issuedBy TEXT NOT NULL REFERENCES users (id),
    checkerId TEXT REFERENCES users (id), issuedAt DATETIME NOT NULL, createdAt DATETIME NOT NULL, updatedAt DATETIME NOT NULL,
    UNIQUE (organisationId, id), UNIQUE (memoId, sequence),
    FOREIGN KEY (organisationId, memoId) REFERENCES memos (organisationId, id) ON DELETE CASCADE
  )`,
  `CREATE TABLE shareLinks (
    id TEXT PRIMARY KEY, organisationId TEXT NOT NULL, memoRevisionId TEXT NOT NULL, tokenHash TEXT NOT NULL UNIQUE,
    recipient TEXT NOT NULL, expiresAt DATETIME NOT NULL, revokedAt DATETIME, createdBy TEXT NOT NULL REFERENCES users (id),
    createdAt DATETIME NOT NULL, updatedAt DATETIME NOT NULL, UNIQUE (organisationId, id),
    FOREIGN KEY (organisationId, memoRevisionId) REFERENCES memoRevisions (organisationId, id) ON DELETE CASCADE
  )`,
  `CREATE TABLE shareVisits (
    id TEXT PRIMARY KEY, organisationId TEXT NOT NULL, shareLinkId TEXT NOT NULL,
    act TEXT NOT NULL CHECK (act IN ('opened', 'downloaded')), createdAt DATETIME NOT NULL, updatedAt DATETIME NOT NULL,
    FOREIGN KEY (organisationId, shareLinkId) REFERENCES shareLinks (organisationId, id) ON DELETE CASCADE
  )`,
];

const INDEXES = [
  "CREATE INDEX sessionsByExpiry ON sessions (expiresAt)",
  "CREATE INDEX membershipsByUser ON memberships (userId)",
  "CREATE INDEX recordsByStorm ON records (stormId)",
  "CREATE INDEX estimatesByState ON estimates (state)",
  "CREATE INDEX shareLinksByRevision ON shareLinks (memoRevisionId)",
  "CREATE INDEX shareVisitsByLink ON shareVisits (shareLinkId)",
];

function tableName(statement: string): string {
  return statement.split(/\s+/)[2];
}

export const firstTables: Migration = {
  name: "2026-12-01-first-tables",
  async up({ context: { query } }) {
    for (const statement of [...TABLES, ...INDEXES]) await query(statement);
  },
  async down({ context: { query } }) {
    for (const statement of [...TABLES].reverse()) await query(`DROP TABLE ${tableName(statement)}`);
  },
};
