/** The figures of a response page, drawn once for each width and kept while they are asked for. */
import { bandsOf, changing, forcingData, localOutline } from "./figure-data";
import type { FigureId } from "./headline-figures";
import type { InputsRegister } from "./inputs-register";
import { presentUncertainty } from "./present-uncertainty";
import { Recent } from "./recent";
import type { StormForcing } from "./storm-forcing";
import { driftTrack } from "~/figures/drift-track";
import type { Figure } from "~/figures/figure";
import { FIGURE_WIDTHS, type FigureContext } from "~/figures/figure-context";
import { forcingStack } from "~/figures/forcing-stack";
import { hodograph } from "~/figures/hodograph";
import { layerStack, type LayerStackData } from "~/figures/layer-stack";
import { serverPlotDocument } from "~/figures/plot-document.server";
import type { SeriesBand } from "~/figures/response-panels";
import { stressAndDrift } from "~/figures/stress-and-drift";
import { tornado } from "~/figures/tornado";
import type { BandName, Response } from "~/ocean/response";
import type { UnitChoices } from "~/units/unit-choices";
import { epochSeconds } from "~/units/format-time";

/** The same figure for the page and, without its table, for a telephone. */
export interface FigurePair {
  wide: Figure;
  narrow: Figure;
}

export interface ResponseFigures {
  forcing: FigurePair | null;
  stressAndDrift: FigurePair;
  layer: FigurePair;
  track: FigurePair;
  hodograph: FigurePair;
  /** What each headline figure depends on; none without an ensemble. */
  tornadoes: Partial<Record<FigureId, FigurePair>>;
}

export interface FigureRequest {
  response: Response;
  register: InputsRegister;
  /** Null where the storm's series are no longer those of the response. */
  forcing: StormForcing | null;
  zone: string;
  units: UnitChoices;
  estimateCode: string;
}

const recent = new Recent<ResponseFigures>(32);

/** px: two thirds of the page, and one. */
const MAIN_WIDTH = 780;
const SIDE_WIDTH = 400;

function draw({ response, register, forcing, ...shared }: FigureRequest): ResponseFigures {
  const { series, headline } = response;
  const time = series.time.map(epochSeconds);
  const triggers = headline.triggers;
  const pair = (make: (context: FigureContext) => Figure, width = MAIN_WIDTH): FigurePair => {
    const at = (px: number) => make({ ...shared, document: serverPlotDocument(), width: px });
    const narrow = at(FIGURE_WIDTHS.narrow);
    return { wide: at(width), narrow: { ...narrow, table: { columns: [], rows: [] } } };
  };
  const { uncertainty } = response;
  const banded = bandsOf(response);
  const effects = uncertainty ? presentUncertainty(uncertainty, register.box.shoreNormal !== null).effects : [];
  const drivenBy = forcing && forcingData(forcing, response.method, register);
  return {
    forcing: drivenBy && pair((context) => forcingStack(drivenBy, context)),
    stressAndDrift: pair((context) =>
      stressAndDrift(
        {
          ...series,
          time,
          triggers,
          bands: banded && { stress: banded("stress"), driftSpeed: banded("driftSpeed") },
        },
        context,
      ),
    ),
    layer: pair((context) =>
      layerStack(
        { ...series, time, layerDepth: changing(series.layerDepth), triggers, bands: banded && layerBands(banded) },
        context,
      ),
    ),
    track: pair(
      (context) => driftTrack({ ...series, time, box: localOutline(register.box.polygon) }, context),
      SIDE_WIDTH,
    ),
    hodograph: pair((context) => hodograph({ ...series, time }, context), SIDE_WIDTH),
    tornadoes: Object.fromEntries(
      effects.map(({ id, tornado: data }) => [id, pair((context) => tornado(data, context), SIDE_WIDTH)]),
    ),
  };
}

function layerBands(banded: (name: BandName) => SeriesBand): LayerStackData["bands"] {
  return {
    temperature: banded("temperature"),
    salinity: banded("salinity"),
    density: banded("density"),
    layerDepth: banded("layerDepth"),
  };
}

export function responseFigures(request: FigureRequest): ResponseFigures {
  const { response, register, forcing, zone, units, estimateCode } = request;
  const key = JSON.stringify([
    [response.inputs, response.engine, zone, units, estimateCode],
    [register.box.polygon, forcing !== null],
  ]);
  const figures = recent.get(key) ?? draw(request);
  recent.set(key, figures);
  return figures;
}
