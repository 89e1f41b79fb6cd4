import type { RouterContextProvider } from "react-router";
import type { Actor, CurrentOrganisation } from "~/context";
import type { Project } from "~/db/models/project.server";
import type { Tenant } from "~/db/scoped.server";
import type { Action } from "~/organisations/permissions";
import { allowed, notFound } from "~/services/guard.server";

export interface CurrentProject {
  actor: Actor;
  organisation: CurrentOrganisation;
  tenant: Tenant;
  project: Project;
}

/** The project that the address names, where it is this organisation's and the actor may do this; else 404 or 403. */
export async function currentProject(
  context: Readonly<RouterContextProvider>,
  params: { project?: string },
  action: Action,
): Promise<CurrentProject> {
  const { actor, organisation, tenant } = allowed(context, action);
  const project = await tenant.projects.find(params.project ?? "");
  if (!project) notFound();
  return { actor, organisation, tenant, project };
}
