import type { Route } from "./+types/quality-csv";
import { currentProject } from "~/projects/current-project.server";
import { readFilter } from "~/quality/flag-filter";
import { findSamples } from "~/quality/find-samples";
import { flagsCsv } from "~/quality/flags-csv";
import { loadQuality } from "~/quality/load-quality.server";
import { fileResponse } from "~/services/file-response.server";
import { stormOf } from "~/storms/stored-record.server";

/** Values with their flags; the same address part as the quality page's chooses which. */
export async function loader({ context, params, request }: Route.LoaderArgs) {
  const { tenant, project } = await currentProject(context, params, "project.view");
  const storm = await stormOf(tenant, project.id, params.storm);
  const { judged, window, setAt } = await loadQuality(tenant, storm);
  const { filter } = readFilter(new URL(request.url).searchParams, project.timeZone);
  const places = window ? findSamples(judged, filter, window, (place) => setAt(place) !== null) : [];
  return fileResponse(flagsCsv(places, setAt), { name: `${storm.name} flags.csv`, type: "text/csv; charset=utf-8" });
}
