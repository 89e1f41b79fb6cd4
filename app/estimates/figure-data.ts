/** What the figures of an estimate are drawn from, for its page and for a memo. */
import type { StormForcing } from "./storm-forcing";
import type { InputsRegister } from "./inputs-register";
import { linearAt } from "./resample";
import { windAtTenMetres } from "./wind-at-ten-metres";
import { measureBox } from "~/area/measure-box";
import type { LocalPosition } from "~/figures/drift-track";
import type { ForcingData } from "~/figures/forcing-stack";
import type { SeriesBand } from "~/figures/response-panels";
import type { BandName, MethodUsed, Response } from "~/ocean/response";
import type { Position } from "~/ocean/scenario";
import { trackSentence } from "~/storms/storm-track";
import { epochSeconds } from "~/units/format-time";

const EARTH_RADIUS = 6_371_008.8;
const RADIANS = Math.PI / 180;

/** Corners in metres from the middle, on a tangent plane: within a thousandth at the size of a box. */
export function localOutline(polygon: Position[]): LocalPosition[] {
  const [longitude, latitude] = measureBox(polygon).centroid;
  return polygon.map(([lon, lat]) => {
    const east = ((lon - longitude + 540) % 360) - 180;
    return [
      east * RADIANS * EARTH_RADIUS * Math.cos(latitude * RADIANS),
      (lat - latitude) * RADIANS * EARTH_RADIUS,
    ] as const;
  });
}

function netHeat({ heat, time }: StormForcing): number[] | undefined {
  if (!heat) return undefined;
  const series = [heat.net, heat.shortwave, heat.longwave, heat.sensible, heat.latent].flatMap((part) =>
    part ? [part] : [],
  );
  return time.map((_, index) => series.reduce((sum, part) => sum + part[index], 0));
}

/** Said of a wind that a track gave; nothing of one that was recorded. */
function windOrigin({ storm }: InputsRegister): string | undefined {
  const recorded = storm.quality?.channels.some(({ channel }) => channel === "windSpeed");
  return storm.track && !recorded ? trackSentence(storm.track) : undefined;
}

/** Wind as the engine took it, at 10 m; rain and heat where the storm has them. */
export function forcingData(forcing: StormForcing, method: MethodUsed, register: InputsRegister): ForcingData {
  return {
    time: forcing.time,
    windSpeed10: windAtTenMetres(forcing, method),
    windFrom: forcing.windFrom,
    rainRate: forcing.rain,
    netHeat: netHeat(forcing),
    windOrigin: windOrigin(register),
  };
}

/**
 * A response's bands at the times of its series: as they are, or on the line between their samples where a long storm has
 * fewer of them; undefined where no ensemble ran.
 */
export function bandsOf({ series, bands, uncertainty }: Response): ((name: BandName) => SeriesBand) | undefined {
  if (!bands || !uncertainty) return undefined;
  const members = uncertainty.computed;
  const at = series.time.map(epochSeconds);
  const knots = bands.time.map(epochSeconds);
  const between = (values: number[]) =>
    knots.length === at.length ? values : at.map((moment) => linearAt({ time: knots, values }, moment));
  return (name) => {
    const { p10, p50, p90 } = bands.series[name];
    return { p10: between(p10), p50: between(p50), p90: between(p90), members };
  };
}

/** Depth that never changes says nothing through time. */
export function changing(values: number[]): number[] | undefined {
  return values.some((value) => value !== values[0]) ? values : undefined;
}
