import type { Route } from "./+types/response-json";
import { estimateCode } from "~/estimates/estimate-code";
import { loadResponse } from "~/estimates/load-response.server";
import { currentProject } from "~/projects/current-project.server";
import { fileResponse } from "~/services/file-response.server";
import { notFound } from "~/services/guard.server";

export async function loader({ context, params }: Route.LoaderArgs) {
  const { tenant, project } = await currentProject(context, params, "project.view");
  const loaded = await loadResponse(tenant, project, params.estimate);
  if (!loaded?.response) notFound();
  const name = `${estimateCode(project.jobNumber, loaded.estimate.number)}-response.json`;
  return fileResponse(`${JSON.stringify(loaded.response, null, 2)}\n`, {
    name,
    type: "application/json; charset=utf-8",
  });
}
