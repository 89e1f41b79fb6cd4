import { MM_PER_HOUR } from "../constants";
import type { ScenarioStorm } from "../scenario";
import type { DragLaw } from "../stress/drag-law";
import { secondsOf } from "../time-stamps";
import { windComponents } from "../wind/components";
import { logLawWind10 } from "../wind/log-law";

/** The storm as the models want it: n samples, SI units, wind at 10 m. */
export interface Forcing {
  /** s since the first sample */
  seconds: Float64Array;
  /** Instant of the first sample, s. */
  origin: number;
  /** m/s at 10 m, towards east and north */
  windU: Float64Array;
  windV: Float64Array;
  /** m/s, holding until the next sample */
  rain: Float64Array;
  evaporation: Float64Array | null;
  /** W/m², positive into the sea */
  netHeat: Float64Array;
  shortwave: Float64Array | null;
  latent: Float64Array | null;
  heatInterpolation: "linear" | "hold";
}

/** Reads a valid storm; the wind is brought to 10 m by the neutral profile of the drag law in use. */
export function readForcing(storm: ScenarioStorm, law: DragLaw, heatInterpolation: "linear" | "hold"): Forcing {
  const n = storm.time.length;
  const origin = secondsOf(storm.time[0]) ?? 0;
  const seconds = Float64Array.from(storm.time, (stamp) => (secondsOf(stamp) ?? 0) - origin);
  const windU = new Float64Array(n);
  const windV = new Float64Array(n);
  for (let k = 0; k < n; k++) {
    const wind = windComponents(logLawWind10(storm.windSpeed[k], storm.windHeight ?? 10, law), storm.windFrom[k]);
    windU[k] = wind.u;
    windV[k] = wind.v;
  }
  const { heat = {} } = storm;
  const components = [heat.net, heat.shortwave, heat.longwave, heat.sensible, heat.latent];
  return {
    seconds,
    origin,
    windU,
    windV,
    rain: rate(storm.rain) ?? new Float64Array(n),
    evaporation: rate(storm.evaporation),
    netHeat: Float64Array.from({ length: n }, (_, k) =>
      components.reduce((sum, series) => sum + (series?.[k] ?? 0), 0),
    ),
    shortwave: heat.shortwave ? Float64Array.from(heat.shortwave) : null,
    latent: heat.latent ? Float64Array.from(heat.latent) : null,
    heatInterpolation,
  };
}

function rate(series: number[] | undefined): Float64Array | null {
  return series ? Float64Array.from(series, (mmPerHour) => mmPerHour * MM_PER_HOUR) : null;
}

/** Integral of a flux over interval k, per unit of flux × s: trapezium for linear series, left value for held ones. */
export function fluxOver(forcing: Forcing, series: Float64Array, k: number): number {
  const dt = forcing.seconds[k + 1] - forcing.seconds[k];
  return forcing.heatInterpolation === "hold" ? series[k] * dt : ((series[k] + series[k + 1]) / 2) * dt;
}
