import { copyFileSync, mkdtempSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { ROLES, usualStanding, type Role } from "../../app/organisations/permissions";

interface Person {
  email: string;
  password: string;
}

export interface Tenants {
  databaseFile: string;
  /** A value for every parameter of the routes, all of the first organisation. */
  parameters: Record<string, string>;
  people: Record<Role | "otherTenant" | "suspended", Person>;
  /** Slug of the second organisation, and a project of its own. */
  otherOrganisation: string;
  otherProject: string;
  remove(): void;
}

const PASSWORD = "spring tide over the bar";

/**
 * A copy of the demonstration's database with a person for each role, and a second organisation with a project.
 * The database layer reads its file from the environment once, so this may be called once in a test file.
 */
export async function makeTenants(seededDatabase: string): Promise<Tenants> {
  const folder = mkdtempSync(path.join(tmpdir(), "galeprint-tenants-"));
  const databaseFile = path.join(folder, "galeprint.sqlite");
  copyFileSync(seededDatabase, databaseFile);
  process.env.DATABASE_FILE = databaseFile;
  process.env.DATA_DIRECTORY = folder;

  const { closeDatabase, inWriteTransaction } = await import("../../app/db/connection.server");
  const { forOrganisation } = await import("../../app/db/scoped.server");
  const { createUser, membershipBySlug } = await import("../../app/db/unscoped.server");
  const { DEMO } = await import("../../app/db/seeders/demo.server");
  const { signUp } = await import("../../app/organisations/sign-up.server");
  const { beginProject } = await import("../../app/projects/save-project.server");
  const { hashPassword } = await import("../../app/services/password.server");
  const { findUserByEmail } = await import("../../app/db/unscoped.server");
  const { startCast } = await import("../../app/water/stored-cast.server");

  const demoOwner = await findUserByEmail(DEMO.people[0].email);
  const demo = demoOwner && (await membershipBySlug(demoOwner.id, DEMO.slug));
  if (!demo) throw new Error("The database is not the demonstration's.");
  const tenant = forOrganisation(demo.organisation.id);
  const passwordHash = await hashPassword(PASSWORD);
  for (const who of [...ROLES, "suspended"] as const) {
    const values = { email: `${who}@roles.example`, name: `The ${who}`, passwordHash };
    const user = await inWriteTransaction((transaction) => createUser(values, transaction));
    // A suspended owner may no more than anyone who is suspended.
    const standing = usualStanding(who === "suspended" ? "owner" : who);
    const suspendedAt = who === "suspended" ? new Date() : null;
    await tenant.memberships.create({ userId: user.id, ...standing, suspendedAt });
  }

  const other = { email: "other@elsewhere.example", password: PASSWORD };
  const signedUp = await signUp({ organisationName: "Elsewhere Survey", name: "E. Else", ...other });
  const otherUser = signedUp && (await membershipBySlug(signedUp.userId, signedUp.slug));
  if (!signedUp || !otherUser) throw new Error("The second organisation could not sign up.");
  const facts = { name: "Their own job", jobNumber: "1", client: "Nobody", timeZone: "UTC" };
  const otherProject = await beginProject(forOrganisation(otherUser.organisation.id), facts, signedUp.userId);
  if (otherProject.fieldErrors) throw new Error("The second organisation's project was refused.");

  const one = async (row: Promise<{ id: string } | null>) => {
    const found = await row;
    if (!found) throw new Error("The demonstration lacks a row that the routes need.");
    return found.id;
  };
  const record = await tenant.records.first({ where: { origin: "file" }, order: [["createdAt", "ASC"]] });
  const revision = await tenant.memoRevisions.first({ without: ["pdf", "document"] });
  if (!record || !revision) throw new Error("The demonstration has no record or no issued memo.");
  const project = await one(tenant.projects.first({}));
  const cast = {
    name: "cast.csv",
    bytes: new TextEncoder().encode("depth (m),temperature (°C),salinity\n0,20,35\n10,18,35\n"),
    origin: "file" as const,
  };
  const parameters = {
    organisation: DEMO.slug,
    project,
    box: await one(tenant.studyBoxes.first({})),
    storm: record.stormId,
    record: record.id,
    file: await one(tenant.sourceFiles.first({ without: ["bytes"] })),
    column: await one(tenant.waterColumns.first({})),
    cast: await one(startCast(tenant, project, cast, demoOwner.id)),
    estimate: await one(tenant.estimates.first({ where: { state: "done" } })),
    memo: revision.memoId,
    revision: revision.id,
    link: await one(tenant.shareLinks.first({})),
    member: await one(tenant.memberships.first({ where: { role: "viewer" } })),
    token: "no-such-token",
    z: "3",
    x: "3",
    y: "2",
  };
  await closeDatabase();
  const person = (who: Role | "suspended") => ({ email: `${who}@roles.example`, password: PASSWORD });
  return {
    databaseFile,
    parameters,
    people: {
      owner: person("owner"),
      admin: person("admin"),
      consultant: person("consultant"),
      viewer: person("viewer"),
      otherTenant: other,
      suspended: person("suspended"),
    },
    otherOrganisation: signedUp.slug,
    otherProject: otherProject.id,
    remove: () => rmSync(folder, { recursive: true, force: true }),
  };
}
