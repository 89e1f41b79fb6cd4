import { bandAt, changing, forcingData, localOutline } from "~/estimates/figure-data";
import type { LoadedResponse } from "~/estimates/load-response.server";
import { driftTrack } from "~/figures/drift-track";
import type { Figure } from "~/figures/figure";
import type { FigureContext } from "~/figures/figure-context";
import { forcingStack } from "~/figures/forcing-stack";
import { hodograph } from "~/figures/hodograph";
import { serverPlotDocument } from "~/figures/plot-document.server";
import { seriesLine } from "~/figures/series-line";
import { stressAndDrift } from "~/figures/stress-and-drift";
import type { BandName, Response } from "~/ocean/response";
import { epochSeconds } from "~/units/format-time";

type Drawn = Pick<LoadedResponse, "register" | "forcing"> & { response: Response };

/** The figures of one estimate in a memo: the answer's own first, short enough to stand on the first sheet. */
export function memoFigures(drawn: Drawn, options: Omit<FigureContext, "document">): Figure[] {
  const { response, register, forcing } = drawn;
  const { series, headline } = response;
  const time = series.time.map(epochSeconds);
  const { triggers } = headline;
  const context: FigureContext = { ...options, document: serverPlotDocument() };
  const layerDepth = changing(series.layerDepth);
  const { bands } = response;
  const band = (name: BandName) => (bands ? bandAt(bands, name, time) : undefined);
  const [stress, driftSpeed] = [band("stress"), band("driftSpeed")];
  return [
    seriesLine("salinity", { time, values: series.salinity, band: band("salinity"), triggers }, context),
    ...(forcing ? [forcingStack(forcingData(forcing, response.method), context)] : []),
    seriesLine("temperature", { time, values: series.temperature, band: band("temperature"), triggers }, context),
    seriesLine("density", { time, values: series.density, band: band("density"), triggers }, context),
    ...(layerDepth
      ? [seriesLine("layerDepth", { time, values: layerDepth, band: band("layerDepth"), triggers }, context)]
      : []),
    stressAndDrift(
      { ...series, time, triggers, ...(stress && driftSpeed && { bands: { stress, driftSpeed } }) },
      context,
    ),
    driftTrack({ ...series, time, box: localOutline(register.box.polygon) }, context),
    hodograph({ ...series, time }, context),
  ];
}
