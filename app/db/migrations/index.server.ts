import type { RunnableMigration } from "umzug";
import { firstTables } from "./2026-12-01-first-tables.server";
import { estimateInputs } from "./2026-12-01-estimate-inputs.server";
import { methodSheetEnsembles } from "./2026-12-01-method-sheet-ensembles.server";
import { casts } from "./2026-12-01-casts.server";
import { quality } from "./2026-12-01-quality.server";
import { mail } from "./2026-12-01-mail.server";
import { stormTracks } from "./2026-12-01-storm-tracks.server";
import { members } from "./2026-12-01-members.server";

export interface MigrationContext {
  /** Runs one statement inside the migration's transaction. */
  query: (statement: string) => Promise<void>;
}
export type Migration = RunnableMigration<MigrationContext>;

/** In order. A migration that has been released is never edited: add the next one. */
export const migrations: Migration[] = [
  firstTables,
  estimateInputs,
  methodSheetEnsembles,
  casts,
  quality,
  mail,
  stormTracks,
  members,
];
