import type { ModelRun } from "../models/run-model";
import type { FitNote } from "../response";
import { boxExtent } from "./box-extent";
import { boxRossby } from "./box-rossby";
import { coastDistance } from "./coast-distance";
import { dragCoefficient } from "./drag-coefficient";
import { duration } from "./duration";
import { equatorial } from "./equatorial";
import { windFetch } from "./wind-fetch";
import { fitContext, type Indicator } from "./fit-context";
import { freezing } from "./freezing";
import { layerInWater } from "./layer-in-water";
import { layerRichardson } from "./layer-richardson";
import { salinityRange } from "./salinity-range";
import { samplingGap } from "./sampling-gap";
import { shortwaveAtBase } from "./shortwave-at-base";
import { waterDepth } from "./water-depth";
import { windRange } from "./wind-range";

const INDICATORS: readonly Indicator[] = [
  equatorial,
  coastDistance,
  waterDepth,
  layerInWater,
  duration,
  windRange,
  windFetch,
  dragCoefficient,
  layerRichardson,
  shortwaveAtBase,
  freezing,
  salinityRange,
  boxRossby,
  boxExtent,
  samplingGap,
];

const GRAVEST_FIRST = { doNotUse: 0, caution: 1, ok: 2 } as const;

/** Where the chosen method does and does not apply here, gravest first. */
export function fitNotes(run: ModelRun): FitNote[] {
  const context = fitContext(run);
  const notes = INDICATORS.map((indicator) => indicator(context)).filter((note) => note !== null);
  return notes.sort((a, b) => GRAVEST_FIRST[a.severity] - GRAVEST_FIRST[b.severity]);
}
