/** What the figures of an estimate are drawn from, for its page and for a memo. */
import type { StormForcing } from "./storm-forcing";
import { linearAt } from "./resample";
import { windAtTenMetres } from "./wind-at-ten-metres";
import { measureBox } from "~/area/measure-box";
import type { LocalPosition } from "~/figures/drift-track";
import type { ForcingData } from "~/figures/forcing-stack";
import type { SeriesBand } from "~/figures/response-panels";
import type { BandName, MethodUsed, SeriesBands } from "~/ocean/response";
import type { Position } from "~/ocean/scenario";
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

/** Wind as the engine took it, at 10 m; rain and heat where the storm has them. */
export function forcingData(forcing: StormForcing, method: MethodUsed): ForcingData {
  return {
    time: forcing.time,
    windSpeed10: windAtTenMetres(forcing, method),
    windFrom: forcing.windFrom,
    rainRate: forcing.rain,
    netHeat: netHeat(forcing),
  };
}

/** A band at the times of the series: as it is, or on the line between its samples where a long storm has fewer of them. */
export function bandAt({ time, series }: SeriesBands, name: BandName, at: readonly number[]): SeriesBand {
  const knots = time.map(epochSeconds);
  const { p10, p90 } = series[name];
  if (knots.length === at.length) return { p10, p90 };
  const between = (values: number[]) => at.map((moment) => linearAt({ time: knots, values }, moment));
  return { p10: between(p10), p90: between(p90) };
}

/** Depth that never changes says nothing through time. */
export function changing(values: number[]): number[] | undefined {
  return values.some((value) => value !== values[0]) ? values : undefined;
}
