import type { Migration } from "./index.server";

/** How many members a sheet's estimates run, and their seed: null for none, as every sheet had before. */
export const methodSheetEnsembles: Migration = {
  name: "2026-12-01-method-sheet-ensembles",
  async up({ context: { query } }) {
    await query("ALTER TABLE methodSheets ADD COLUMN ensemble JSON");
  },
  async down({ context: { query } }) {
    await query("ALTER TABLE methodSheets DROP COLUMN ensemble");
  },
};
