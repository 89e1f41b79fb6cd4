import type { Route } from "./+types/draft-pdf";
import { composeDraft } from "~/memo/compose-draft.server";
import { pdfName } from "~/memo/pdf-name";
import { renderPdf } from "~/memo/render-pdf.server";
import { currentProject } from "~/projects/current-project.server";
import { fileResponse } from "~/services/file-response.server";
import { notFound } from "~/services/guard.server";

export async function loader({ context, params }: Route.LoaderArgs) {
  const { tenant, organisation, project } = await currentProject(context, params, "project.view");
  const memo = await tenant.memos.find(params.memo, { where: { projectId: project.id } });
  if (!memo) notFound();
  const { document, attachments } = await composeDraft(tenant, organisation, project, memo);
  return fileResponse(await renderPdf(document, { attachments }), {
    name: pdfName(document.titleBlock),
    type: "application/pdf",
  });
}
