import { inWriteTransaction } from "~/db/connection.server";
import { forOrganisation } from "~/db/scoped.server";
import { createOrganisation, createUser, findUserByEmail, slugIsTaken } from "~/db/unscoped.server";
import { DEFAULT_METHOD_SHEET } from "~/estimates/default-method";
import { hashPassword } from "~/services/password.server";
import { DEFAULT_UNITS } from "~/units/unit-choices";
import { usualStanding } from "./permissions";
import type { Transaction } from "sequelize";

export interface SignUp {
  organisationName: string;
  name: string;
  email: string;
  password: string;
}

function slugFrom(name: string): string {
  const plain = name
    .normalize("NFKD")
    .replace(/[^\p{ASCII}]/gu, "")
    .toLowerCase()
    .replace(/[^a-z0-9]+/g, "-")
    .replace(/^-+|-+$/g, "")
    .slice(0, 40);
  return plain.length >= 2 ? plain : `organisation-${plain}`.replace(/-$/, "");
}

async function freeSlug(name: string, transaction: Transaction): Promise<string> {
  const base = slugFrom(name);
  for (let attempt = 1; ; attempt++) {
    const slug = attempt === 1 ? base : `${base}-${attempt}`;
    if (!(await slugIsTaken(slug, transaction))) return slug;
  }
}

/** A person with an organisation of which they are the owner; null where the address already has an account. */
export async function signUp(values: SignUp): Promise<{ userId: string; slug: string } | null> {
  const passwordHash = await hashPassword(values.password);
  if (await findUserByEmail(values.email)) return null;
  return inWriteTransaction(async (transaction) => {
    const user = await createUser({ email: values.email, name: values.name, passwordHash }, transaction);
    const slug = await freeSlug(values.organisationName, transaction);
    const organisation = await createOrganisation(
      { slug, name: values.organisationName, units: DEFAULT_UNITS, paperSize: "A4" },
      transaction,
    );
    const tenant = forOrganisation(organisation.id, transaction);
    await tenant.memberships.create({ userId: user.id, ...usualStanding("owner") });
    await tenant.methodSheets.create({ ...DEFAULT_METHOD_SHEET, version: 1 });
    return { userId: user.id, slug };
  });
}
