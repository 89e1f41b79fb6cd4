import { canonicalJson } from "~/ocean/canonical-json";
import type { Ensemble, MethodChoices } from "~/ocean/scenario";
import type { Tenant } from "~/db/scoped.server";

/** A sheet is never edited: the same name begins the next version, unless nothing in it changed. */
export async function saveMethodSheet(
  tenant: Tenant,
  name: string,
  choices: MethodChoices,
  ensemble: Ensemble | null,
): Promise<{ version: number; changed: boolean }> {
  return tenant.write(async (inner) => {
    const last = await inner.methodSheets.first({ where: { name }, order: [["version", "DESC"]] });
    if (last && canonicalJson([last.choices, last.ensemble]) === canonicalJson([choices, ensemble])) {
      return { version: last.version, changed: false };
    }
    const version = (last?.version ?? 0) + 1;
    await inner.methodSheets.create({ name, version, choices, ensemble });
    return { version, changed: true };
  });
}
