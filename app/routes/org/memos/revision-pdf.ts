import type { Route } from "./+types/revision-pdf";
import { pdfName } from "~/memo/pdf-name";
import { currentProject } from "~/projects/current-project.server";
import { currentRevision } from "~/memo/current-revision.server";
import { fileResponse } from "~/services/file-response.server";

export async function loader({ context, params }: Route.LoaderArgs) {
  const { tenant, project } = await currentProject(context, params, "project.view");
  const { revision } = await currentRevision(tenant, project, params);
  return fileResponse(revision.pdf, { name: pdfName(revision.document.titleBlock), type: "application/pdf" });
}
