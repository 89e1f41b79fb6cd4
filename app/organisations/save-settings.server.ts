import type { OrganisationSettings } from "./settings-schema";
import { updateOrganisation } from "~/db/unscoped.server";

/** How the organisation is called, what it prints on and what it reads its numbers in. Issued memos stay as they are. */
export async function saveSettings(organisationId: string, settings: OrganisationSettings): Promise<void> {
  const { name, paperSize, ...units } = settings;
  await updateOrganisation(organisationId, { name, paperSize, units: { ...units, temperature: "°C" } });
}
