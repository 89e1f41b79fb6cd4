import type { Storm } from "~/db/models/storm.server";
import type { Tenant } from "~/db/scoped.server";
import { StormRefusal } from "./refusal";

/** @throws StormRefusal for a name that is empty or taken */
export async function renameStorm(tenant: Tenant, storm: Storm, name: string): Promise<void> {
  if (name === "") throw new StormRefusal("Write the name of the storm.", "name");
  await tenant.write(async (inner) => {
    const namesake = await inner.storms.first({ where: { projectId: storm.projectId, name } });
    if (namesake && namesake.id !== storm.id) {
      throw new StormRefusal(`Another storm of this project is named "${name}".`, "name");
    }
    await inner.storms.update(storm.id, { name });
  });
}
