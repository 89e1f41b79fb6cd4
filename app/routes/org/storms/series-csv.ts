import type { Route } from "./+types/series-csv";
import { currentProject } from "~/projects/current-project.server";
import { fileResponse } from "~/services/file-response.server";
import { loadSeries } from "~/storms/load-series.server";
import { seriesCsv } from "~/storms/series-csv";
import { trackPlace } from "~/storms/track-place.server";
import { withTrack } from "~/storms/track-series";
import { windowOf, withinWindow } from "~/storms/storm-window";
import { stormOf } from "~/storms/stored-record.server";

/** The storm's series, with `?box=` a track's at that box, inside its window, or with `?extent=record` all that its records hold. */
export async function loader({ context, params, request }: Route.LoaderArgs) {
  const { tenant, project } = await currentProject(context, params, "project.view");
  const storm = await stormOf(tenant, project.id, params.storm);
  const { place } = await trackPlace(tenant, project.id, request);
  const all = withTrack(await loadSeries(tenant, storm.id), storm.track, place);
  const window = windowOf(storm);
  const whole = new URL(request.url).searchParams.get("extent") === "record";
  const series = window && !whole ? all.map((entry) => withinWindow(entry, window)) : all;
  return fileResponse(seriesCsv(series), { name: `${storm.name}.csv`, type: "text/csv; charset=utf-8" });
}
