import type { Cast } from "~/db/models/cast.server";
import type { Tenant } from "~/db/scoped.server";
import { dropIfUnused } from "~/storms/original.server";
import { castBehind } from "./stored-cast.server";

/** Takes a cast away that was not confirmed, with its original where nothing else uses it. */
export async function removeCast(tenant: Tenant, cast: Cast): Promise<void> {
  await tenant.write(async (inner) => {
    await inner.casts.remove({ id: cast.id });
    await dropIfUnused(inner, [cast.sourceFileId]);
  });
}

/** Takes a column away with the estimates on it, its cast, and the original where nothing else uses it. */
export async function removeColumn(tenant: Tenant, columnId: string): Promise<void> {
  await tenant.write(async (inner) => {
    const cast = await castBehind(inner, columnId);
    await inner.waterColumns.remove({ id: columnId });
    await dropIfUnused(inner, [cast?.sourceFileId ?? null]);
  });
}
