import { GRAVITY, VON_KARMAN } from "../constants";
import { requireFinite, requireNotNegative, requirePositive } from "../guards";
import { largeYeager2009 } from "../stress/laws/large-yeager-2009";

export interface LargeYeagerInput {
  /** m/s at `height` */
  windSpeed: number;
  /** Potential temperature of the air, K. */
  airTemperature: number;
  /** Specific humidity of the air, kg/kg. */
  q: number;
  /** K */
  seaTemperature: number;
  /** Specific humidity at the sea surface, kg/kg. */
  qsea: number;
  /** m */
  height: number;
  /** kg/m³ */
  airDensity: number;
  iterations?: number;
  /** J/kg/K */
  airHeatCapacity?: number;
  /** J/kg */
  latentHeat?: number;
}

export interface LargeYeagerFluxes {
  CD: number;
  CH: number;
  CE: number;
  /** N/m² */
  tau: number;
  /** Sensible and latent heat, W/m², positive OUT of the sea. */
  sensibleLoss: number;
  latentLoss: number;
}

/** Lightest wind reckoned with, m/s. */
const LEAST_WIND = 0.5;

/**
 * Transfer coefficients and fluxes over the sea, brought from neutral to the air's own stability by iteration.
 * @throws OceanError INVALID_INPUT
 * @see Large & Yeager (2009), Climate Dynamics 33:341-364
 */
export function largeYeagerFluxes(input: LargeYeagerInput): LargeYeagerFluxes {
  const {
    airTemperature,
    q,
    seaTemperature,
    qsea,
    height,
    airDensity,
    iterations = 5,
    airHeatCapacity = 1000.5,
    latentHeat = 2.5e6,
  } = input;
  requireNotNegative({ windSpeed: input.windSpeed, q, qsea });
  requirePositive({ airTemperature, seaTemperature, height, airDensity, iterations, airHeatCapacity, latentHeat });
  requireFinite({ q, qsea });
  const U = Math.max(LEAST_WIND, input.windSpeed);
  const virtual = airTemperature * (1 + 0.608 * q);
  const logHeight = Math.log(height / 10);

  let neutral = neutralCoefficients(U, airTemperature > seaTemperature);
  let [CD, CH, CE] = [neutral.cd, neutral.ch, neutral.ce];
  for (let iteration = 0; iteration < iterations; iteration++) {
    const root = Math.sqrt(CD);
    const ustar = root * U;
    const tstar = (CH / root) * (airTemperature - seaTemperature);
    const qstar = (CE / root) * (q - qsea);
    const buoyancy = tstar / virtual + qstar / (q + 1 / 0.608);
    const zeta = clamp((VON_KARMAN * GRAVITY * height * buoyancy) / (ustar * ustar), -10, 10);
    const { psiM, psiH } = stabilityFunctions(zeta);
    const wind10 = Math.max(LEAST_WIND, U / (1 + (Math.sqrt(neutral.cd) / VON_KARMAN) * (logHeight - psiM)));
    neutral = neutralCoefficients(wind10, zeta > 0);
    const rootN = Math.sqrt(neutral.cd);
    const xm = (logHeight - psiM) / VON_KARMAN;
    const xh = (logHeight - psiH) / VON_KARMAN;
    CD = neutral.cd / (1 + rootN * xm) ** 2;
    const ratio = Math.sqrt(CD / neutral.cd);
    CH = (neutral.ch / (1 + (neutral.ch * xh) / rootN)) * ratio;
    CE = (neutral.ce / (1 + (neutral.ce * xh) / rootN)) * ratio;
  }
  return {
    CD,
    CH,
    CE,
    tau: airDensity * CD * U * U,
    sensibleLoss: airDensity * airHeatCapacity * CH * (seaTemperature - airTemperature) * U,
    latentLoss: airDensity * latentHeat * CE * (qsea - q) * U,
  };
}

function neutralCoefficients(wind10: number, stable: boolean) {
  const cd = largeYeager2009(wind10);
  const root = Math.sqrt(cd);
  return { cd, ce: 34.6e-3 * root, ch: (stable ? 18.0e-3 : 32.7e-3) * root };
}

function stabilityFunctions(zeta: number): { psiM: number; psiH: number } {
  if (zeta >= 0) return { psiM: -5 * zeta, psiH: -5 * zeta };
  const X2 = Math.max(1, Math.sqrt(Math.abs(1 - 16 * zeta)));
  const X = Math.sqrt(X2);
  return {
    psiM: Math.log(((1 + 2 * X + X2) * (1 + X2)) / 8) - 2 * (Math.atan(X) - Math.PI / 4),
    psiH: 2 * Math.log((1 + X2) / 2),
  };
}

function clamp(value: number, low: number, high: number): number {
  return Math.min(high, Math.max(low, value));
}
