import type { Route } from "./+types/series-csv";
import { estimateCode } from "~/estimates/estimate-code";
import { loadResponse } from "~/estimates/load-response.server";
import { responseCsv } from "~/estimates/response-csv";
import { currentProject } from "~/projects/current-project.server";
import { fileResponse } from "~/services/file-response.server";
import { notFound } from "~/services/guard.server";

export async function loader({ context, params }: Route.LoaderArgs) {
  const { tenant, project } = await currentProject(context, params, "project.view");
  const loaded = await loadResponse(tenant, project, params.estimate, { profiles: false });
  if (!loaded?.response) notFound();
  const name = `${estimateCode(project.jobNumber, loaded.estimate.number)}-series.csv`;
  return fileResponse(responseCsv(loaded.response), { name, type: "text/csv; charset=utf-8" });
}
