import { organisationsOfUser } from "~/db/unscoped.server";
import type { Role } from "./permissions";

/** The organisations that a person belongs to, by name. */
export async function myOrganisations(userId: string): Promise<{ slug: string; name: string; role: Role }[]> {
  const mine = await organisationsOfUser(userId);
  return mine.map(({ organisation: { slug, name }, standing: { role } }) => ({ slug, name, role }));
}
