import type { Migration } from "./index.server";

/** What an estimate's last run stood on, so that it can say which of its inputs changed since. */
export const estimateInputs: Migration = {
  name: "2026-12-01-estimate-inputs",
  async up({ context: { query } }) {
    await query("ALTER TABLE estimates ADD COLUMN inputs JSON");
  },
  async down({ context: { query } }) {
    await query("ALTER TABLE estimates DROP COLUMN inputs");
  },
};
