import { driftTrack } from "~/figures/drift-track";
import type { Figure } from "~/figures/figure";
import type { FigureContext } from "~/figures/figure-context";
import { forcingStack } from "~/figures/forcing-stack";
import { hodograph } from "~/figures/hodograph";
import { layerStack } from "~/figures/layer-stack";
import { serverPlotDocument } from "~/figures/plot-document.server";
import { stressAndDrift } from "~/figures/stress-and-drift";
import { MM_PER_HOUR } from "~/ocean/constants";
import { readForcing } from "~/ocean/forcing/read-forcing";
import type { Response } from "~/ocean/response";
import type { DragLawId, Scenario } from "~/ocean/scenario";
import { dragLaw } from "~/ocean/stress/drag-law";
import { bearingOf } from "~/units/compass";
import { epochSeconds } from "~/units/format-time";

/** Wind at 10 m as the engine took it, rain and heat. */
function forcingFigure({ storm }: Scenario, { method }: Response, time: number[], context: FigureContext): Figure {
  const coefficient = method.dragCoefficient?.value;
  const law = dragLaw(method.dragLaw?.value as DragLawId, typeof coefficient === "number" ? { coefficient } : {});
  const forcing = readForcing(storm, law, method.heatInterpolation?.value === "hold" ? "hold" : "linear");
  const windFrom = time.map((_, k) => bearingOf(-forcing.windU[k], -forcing.windV[k]) ?? Number.NaN);
  return forcingStack(
    {
      time,
      windSpeed10: time.map((_, k) => Math.hypot(forcing.windU[k], forcing.windV[k])),
      windFrom,
      rainRate: storm.rain ? forcing.rain.map((rate) => rate / MM_PER_HOUR) : undefined,
      netHeat: storm.heat ? forcing.netHeat : undefined,
    },
    context,
  );
}

/** The figures of one estimate in a memo: the answer's own first. */
export function memoFigures(
  response: Response,
  scenario: Scenario | null,
  options: Omit<FigureContext, "document">,
): Figure[] {
  const { series, headline } = response;
  const time = series.time.map(epochSeconds);
  const context: FigureContext = { ...options, document: serverPlotDocument() };
  const { salinity, temperature, density, stressX, stressY, driftEast, driftNorth } = series;
  const { displacementEast, displacementNorth } = series;
  return [
    layerStack({ time, salinity, temperature, density, triggers: headline.triggers }, context),
    ...(scenario ? [forcingFigure(scenario, response, time, context)] : []),
    stressAndDrift({ time, stressX, stressY, driftEast, driftNorth, triggers: headline.triggers }, context),
    driftTrack({ time, displacementEast, displacementNorth }, context),
    hodograph({ time, driftEast, driftNorth }, context),
  ];
}
