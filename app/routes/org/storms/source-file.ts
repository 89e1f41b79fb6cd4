import type { Route } from "./+types/source-file";
import { currentProject } from "~/projects/current-project.server";
import { fileResponse } from "~/services/file-response.server";
import { sourceFileOf } from "~/storms/stored-record.server";

/** An original as it was handed over, byte for byte. */
export async function loader({ context, params }: Route.LoaderArgs) {
  const { tenant, project } = await currentProject(context, params, "project.view");
  const { name, bytes } = await sourceFileOf(tenant, project.id, params.file);
  return fileResponse(bytes, {
    name,
    type: "application/octet-stream",
    headers: { "Content-Security-Policy": "default-src 'none'; sandbox" },
  });
}
