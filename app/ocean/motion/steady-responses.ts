import { complex, scale, type Complex } from "../complex";
import { coastalBalance } from "../ekman/finite-depth-coast";
import {
  finiteDepthBedStress,
  finiteDepthLayerMean,
  finiteDepthTransport,
  type FiniteDepthSetting,
} from "../ekman/finite-depth";
import type { Matrix2, SteadyResponse } from "./steady-motion";

/** Deep water: M = -i τ/(ρf), spread over the layer. */
export function deepResponse(f: number, layerDepth: number, waterDensity: number): SteadyResponse {
  const transport = { xx: 0, xy: 1 / (waterDensity * f), yx: -1 / (waterDensity * f), yy: 0 };
  const drift = { xx: 0, xy: transport.xy / layerDepth, yx: transport.yx / layerDepth, yy: 0 };
  return { drift, transport, resistance: { xx: 0, xy: 0, yx: 0, yy: 0 }, f, waterDensity };
}

/** Water over a bed without slip; drift is the mean of the current from the surface to the layer's base. */
export function finiteDepthResponse(
  setting: FiniteDepthSetting,
  layerDepth: number,
  waterDensity: number,
): SteadyResponse {
  const perStress = (tau: Complex): Column => {
    const T = complex(tau.re / waterDensity, tau.im / waterDensity);
    return {
      drift: finiteDepthLayerMean(T, setting, layerDepth),
      transport: finiteDepthTransport(T, setting),
      resistance: scale(finiteDepthBedStress(T, setting), waterDensity),
    };
  };
  return assembled(perStress, setting.f, waterDensity);
}

/** The same beside a straight shore that nothing passes through. */
export function coastalResponse(
  setting: FiniteDepthSetting,
  layerDepth: number,
  waterDensity: number,
  shoreNormal: number,
  gravity: number,
): SteadyResponse {
  const onshoreTo = (shoreNormal + 180) % 360;
  const along = (azimuth: number): Complex =>
    complex(Math.sin((azimuth * Math.PI) / 180), Math.cos((azimuth * Math.PI) / 180));
  const left = along(onshoreTo - 90);
  const perStress = (tau: Complex): Column => {
    const balance = coastalBalance(complex(tau.re / waterDensity, tau.im / waterDensity), setting, onshoreTo, gravity);
    return {
      drift: balance.layerMean(layerDepth),
      transport: complex(left.re * balance.alongTransport, left.im * balance.alongTransport),
      resistance: scale(balance.resistance, waterDensity),
    };
  };
  return assembled(perStress, setting.f, waterDensity);
}

interface Column {
  drift: Complex;
  transport: Complex;
  resistance: Complex;
}

function assembled(perStress: (tau: Complex) => Column, f: number, waterDensity: number): SteadyResponse {
  const east = perStress(complex(1));
  const north = perStress(complex(0, 1));
  const matrix = (a: Complex, b: Complex): Matrix2 => ({ xx: a.re, xy: b.re, yx: a.im, yy: b.im });
  return {
    drift: matrix(east.drift, north.drift),
    transport: matrix(east.transport, north.transport),
    resistance: matrix(east.resistance, north.resistance),
    f,
    waterDensity,
  };
}
