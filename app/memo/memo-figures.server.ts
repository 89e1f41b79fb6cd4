import { bandsOf, changing, forcingData, localOutline } from "~/estimates/figure-data";
import type { FigureId } from "~/estimates/headline-figures";
import type { LoadedResponse } from "~/estimates/load-response.server";
import { presentUncertainty } from "~/estimates/present-uncertainty";
import { driftTrack } from "~/figures/drift-track";
import type { Figure } from "~/figures/figure";
import type { FigureContext } from "~/figures/figure-context";
import { forcingStack } from "~/figures/forcing-stack";
import { hodograph } from "~/figures/hodograph";
import { serverPlotDocument } from "~/figures/plot-document.server";
import { seriesLine } from "~/figures/series-line";
import { stressAndDrift } from "~/figures/stress-and-drift";
import { tornado, type TornadoData } from "~/figures/tornado";
import type { Response } from "~/ocean/response";
import { epochSeconds } from "~/units/format-time";

type Drawn = Pick<LoadedResponse, "register" | "forcing"> & { response: Response };

/** What the answer's own figures depend on, where an ensemble ran. */
const DEPENDENCES_OF: readonly FigureId[] = ["surfaceSalinity", "surfaceTemperature", "netDisplacement"];

function dependences({ response: { uncertainty }, register }: Drawn): TornadoData[] {
  if (!uncertainty) return [];
  const { effects } = presentUncertainty(uncertainty, register.box.shoreNormal !== null);
  return effects.flatMap(({ id, tornado: data }) => (DEPENDENCES_OF.includes(id) ? [data] : []));
}

/** The figures of one estimate in a memo: the answer's own first, short enough to stand on the first sheet. */
export function memoFigures(drawn: Drawn, options: Omit<FigureContext, "document">): Figure[] {
  const { response, register, forcing } = drawn;
  const { series, headline } = response;
  const time = series.time.map(epochSeconds);
  const { triggers } = headline;
  const context: FigureContext = { ...options, document: serverPlotDocument() };
  const layerDepth = changing(series.layerDepth);
  const banded = bandsOf(response);
  return [
    seriesLine("salinity", { time, values: series.salinity, band: banded?.("salinity"), triggers }, context),
    ...(forcing ? [forcingStack(forcingData(forcing, response.method, register), context)] : []),
    seriesLine("temperature", { time, values: series.temperature, band: banded?.("temperature"), triggers }, context),
    seriesLine("density", { time, values: series.density, band: banded?.("density"), triggers }, context),
    ...(layerDepth
      ? [seriesLine("layerDepth", { time, values: layerDepth, band: banded?.("layerDepth"), triggers }, context)]
      : []),
    stressAndDrift(
      {
        ...series,
        time,
        triggers,
        bands: banded && { stress: banded("stress"), driftSpeed: banded("driftSpeed") },
      },
      context,
    ),
    driftTrack({ ...series, time, box: localOutline(register.box.polygon) }, context),
    hodograph({ ...series, time }, context),
    ...dependences(drawn).map((data) => tornado(data, context)),
  ];
}
