import type { Route } from "./+types/pdf";
import { pdfName } from "~/memo/pdf-name";
import { fileResponse } from "~/services/file-response.server";
import { openShare, SHARE_HEADERS } from "~/sharing/open-share.server";

export async function loader({ request, params }: Route.LoaderArgs) {
  const { revision } = await openShare(request, params.link, "downloaded");
  const name = pdfName(revision.document.titleBlock);
  return fileResponse(revision.pdf, { name, type: "application/pdf", headers: SHARE_HEADERS });
}
