import { UniqueConstraintError } from "sequelize";
import type { z } from "zod";
import type { projectFactsSchema } from "./project-schema";
import type { Tenant } from "~/db/scoped.server";

type ProjectFacts = z.output<typeof projectFactsSchema>;
type Saved = { id: string; fieldErrors?: undefined } | { fieldErrors: { jobNumber: string[] } };

const TAKEN = { fieldErrors: { jobNumber: ["Another project of this organisation has this job number."] } };

async function unlessTaken(save: () => Promise<Saved>): Promise<Saved> {
  try {
    return await save();
  } catch (error) {
    if (error instanceof UniqueConstraintError) return TAKEN;
    throw error;
  }
}

export function beginProject(tenant: Tenant, facts: ProjectFacts, userId: string): Promise<Saved> {
  return unlessTaken(async () => {
    const { name, jobNumber, client, timeZone } = facts;
    return tenant.projects.create({
      name,
      jobNumber,
      client,
      timeZone,
      cautionsAcceptedAt: new Date(),
      cautionsAcceptedBy: userId,
    });
  });
}

export function changeProject(tenant: Tenant, id: string, facts: ProjectFacts): Promise<Saved> {
  return unlessTaken(async () => {
    await tenant.projects.update(id, facts);
    return { id };
  });
}
