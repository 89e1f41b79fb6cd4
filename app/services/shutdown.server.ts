import { closeDatabase } from "~/db/connection.server";
import { closePool } from "~/estimates/pool.server";

/** Called by the server entry when the last request is answered. */
export async function closeResources(): Promise<void> {
  await closePool();
  await closeDatabase();
}
