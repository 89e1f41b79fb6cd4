import { CELSIUS_ZERO, STEFAN_BOLTZMANN } from "../constants";
import { OceanError } from "../errors";
import { requireFinite, requireNotNegative } from "../guards";
import { power } from "../power";

export const LONGWAVE_KINDS = ["berliand", "brunt", "clark"] as const;
export type LongwaveKind = (typeof LONGWAVE_KINDS)[number];

export interface LongwaveInput {
  kind?: LongwaveKind;
  /** °C */
  seaTemperature: number;
  airTemperature: number;
  /** Vapour pressure of the air, hPa. */
  vapourPressure: number;
  /** 0…1 */
  cloud: number;
  /** F = 1 - a Cⁿ */
  cloudCoefficient?: number;
  cloudExponent?: number;
  emissivity?: number;
}

/**
 * Net longwave radiation from the sea by bulk formulas.
 * @returns W/m², positive OUT of the sea
 * @throws OceanError INVALID_INPUT
 * @see Fung, Harrison & Lacis (1984), Reviews of Geophysics 22:177-193
 */
export function netLongwaveLoss(input: LongwaveInput): number {
  const { kind = "berliand", seaTemperature, airTemperature, vapourPressure, cloud } = input;
  const { cloudCoefficient = 0.8, cloudExponent = 1, emissivity = 0.97 } = input;
  requireFinite({ seaTemperature, airTemperature, cloudCoefficient, cloudExponent });
  requireNotNegative({ vapourPressure, cloud, emissivity });
  if (cloud > 1) throw new OceanError("INVALID_INPUT", `Cloud cover must lie within 0…1; it is ${cloud}.`);
  const sea = seaTemperature + CELSIUS_ZERO;
  const air = airTemperature + CELSIUS_ZERO;
  const clearSky = 0.39 - 0.05 * Math.sqrt(vapourPressure);
  const F = 1 - cloudCoefficient * power(cloud, cloudExponent);
  const radiation = emissivity * STEFAN_BOLTZMANN;
  switch (kind) {
    case "berliand":
      return radiation * power(air, 4) * clearSky * F + 4 * radiation * power(air, 3) * (sea - air);
    case "brunt":
      return radiation * power(sea, 4) * clearSky * F;
    case "clark":
      return (
        radiation * power(sea, 4) * clearSky * (1 - 0.51 * cloud * cloud) + 4 * radiation * power(sea, 3) * (sea - air)
      );
    default:
      throw new OceanError(
        "INVALID_INPUT",
        `Unknown longwave formula "${String(kind)}"; known are ${LONGWAVE_KINDS.join(", ")}.`,
      );
  }
}
