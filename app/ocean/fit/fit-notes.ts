import type { FitNote } from "../response";
import { boxExtent } from "./box-extent";
import { boxRossby } from "./box-rossby";
import { boxStormSize } from "./box-storm-size";
import { coastDistance } from "./coast-distance";
import { dragCoefficient } from "./drag-coefficient";
import { duration } from "./duration";
import { equatorial } from "./equatorial";
import type { FitContext, Indicator } from "./fit-context";
import { freezing } from "./freezing";
import { layerInWater } from "./layer-in-water";
import { layerRichardson } from "./layer-richardson";
import { layerStability } from "./layer-stability";
import { mixedToBed } from "./mixed-to-bed";
import { modelChoice } from "./model-choice";
import { practicalSalinityRange } from "./practical-salinity";
import { salinityRange } from "./salinity-range";
import { samplingGap } from "./sampling-gap";
import { shortwaveAtBase } from "./shortwave-at-base";
import { stormSpeed } from "./storm-speed";
import { upwellingUnderStorm } from "./upwelling-under-storm";
import { waterDepth } from "./water-depth";
import { windFetch } from "./wind-fetch";
import { windHeight } from "./wind-height";
import { windRange } from "./wind-range";

const INDICATORS: readonly Indicator[] = [
  equatorial,
  coastDistance,
  waterDepth,
  mixedToBed,
  layerInWater,
  duration,
  upwellingUnderStorm,
  stormSpeed,
  windRange,
  windHeight,
  windFetch,
  dragCoefficient,
  layerStability,
  layerRichardson,
  shortwaveAtBase,
  freezing,
  salinityRange,
  practicalSalinityRange,
  boxStormSize,
  boxRossby,
  boxExtent,
  samplingGap,
  modelChoice,
];

const GRAVEST_FIRST = { doNotUse: 0, caution: 1, ok: 2 } as const;

/** Where the chosen method does and does not apply here, gravest first. */
export function fitNotes(context: FitContext): FitNote[] {
  const notes = INDICATORS.map((indicator) => indicator(context)).filter((note) => note !== null);
  return notes.sort((a, b) => GRAVEST_FIRST[a.severity] - GRAVEST_FIRST[b.severity]);
}
