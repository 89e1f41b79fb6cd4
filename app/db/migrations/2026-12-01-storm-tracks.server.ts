import type { Migration } from "./index.server";

/** A storm may stand on a cyclone's track; the track's file waits there until its questions are answered. */
export const stormTracks: Migration = {
  name: "2026-12-01-storm-tracks",
  async up({ context: { query } }) {
    await query("ALTER TABLE storms ADD COLUMN track JSON");
    await query("ALTER TABLE storms ADD COLUMN trackFileId TEXT");
  },
  async down({ context: { query } }) {
    await query("ALTER TABLE storms DROP COLUMN track");
    await query("ALTER TABLE storms DROP COLUMN trackFileId");
  },
};
