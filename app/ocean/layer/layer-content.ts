import { HOTTEST, SALTIEST } from "../constants";
import { OceanError } from "../errors";
import { evaporationRate } from "../heat/evaporation";
import { fluxOver, type Forcing } from "../forcing/read-forcing";
import { rainDilution } from "../freshwater/rain-dilution";
import { shortwaveFraction, waterClarity } from "../heat/shortwave";
import { assumedRainHeatLoss } from "../heat/assumed-rain-heat";
import type { ResolvedMethod } from "../method/resolve-method";
import type { Budget } from "../response";
import { potentialFromConservative } from "../seawater/conservative-temperature";
import { freezingTemperature } from "../seawater/freezing";
import type { InitialWater } from "../water/initial-water";

/** Heat and salt of a layer of fixed depth, at each of the storm's n samples. */
export interface LayerContent {
  /** Conservative Temperature, °C. */
  CT: Float64Array;
  /** Absolute Salinity, g/kg. */
  SA: Float64Array;
  /** Fresh water received since the start, m (rain less evaporation). */
  freshWater: Float64Array;
  /** Heat that could not be taken from a layer at its freezing point, J/m². */
  freezingDeficit: number;
  /** J/m² */
  heat: Budget;
  /** kg/m² */
  salt: Budget;
}

/**
 * Heats and freshens a layer of fixed depth: ΔCT = ∫Q dt/(ρ cp D) and S = S0 D/(D + ∫(P - E) dt).
 * Light that passes the base leaves the layer where the method says so.
 * @throws OceanError INVALID_INPUT where the layer would pass 50 °C or 60 g/kg; NONPOSITIVE_DEPTH where it evaporates away
 */
export function layerContent(forcing: Forcing, water: InitialWater, method: ResolvedMethod): LayerContent {
  const n = forcing.seconds.length;
  const CT = new Float64Array(n).fill(water.CT);
  const SA = new Float64Array(n).fill(water.SA);
  const freshWater = new Float64Array(n);
  const capacity = method.waterDensity * method.heatCapacity * water.layerDepth;
  const passing = method.penetratingShortwave ? shortwaveFraction(waterClarity(method.waterType), water.layerDepth) : 0;
  let heatIn = 0;
  let freezingDeficit = 0;
  for (let k = 0; k + 1 < n; k++) {
    const dt = forcing.seconds[k + 1] - forcing.seconds[k];
    const heat = intervalHeat(forcing, method, k, passing, CT[k], SA[k]);
    freshWater[k + 1] = freshWater[k] + forcing.rain[k] * dt - evaporated(forcing, k, CT[k], SA[k]);
    // Not below zero by rounding where a flood leaves no salt to speak of.
    SA[k + 1] = Math.max(0, water.SA + rainDilution(water.SA, water.layerDepth, freshWater[k + 1]));
    requireBearableSalinity(SA[k + 1], forcing.seconds[k + 1], water.layerDepth);
    const warmed = CT[k] + heat / capacity;
    const freezing = freezingTemperature(SA[k + 1], 0);
    // Only cooling is stopped at freezing; a layer that starts below it is left as it was given.
    const held = heat < 0 && warmed < freezing ? Math.min(CT[k], freezing) : warmed;
    const deficit = (held - warmed) * capacity;
    requireBearableHeat(held, forcing.seconds[k + 1], water.layerDepth);
    CT[k + 1] = held;
    freezingDeficit += deficit;
    heatIn += heat + deficit;
  }
  const heatChange = capacity * (CT[n - 1] - CT[0]);
  const gramsToKilograms = method.waterDensity / 1000;
  const saltChange = gramsToKilograms * (SA[n - 1] * (water.layerDepth + freshWater[n - 1]) - SA[0] * water.layerDepth);
  return {
    CT,
    SA,
    freshWater,
    freezingDeficit,
    heat: { change: heatChange, input: heatIn, residual: heatChange - heatIn },
    salt: { change: saltChange, input: 0, residual: saltChange },
  };
}

function requireBearableHeat(CT: number, seconds: number, layerDepth: number): void {
  if (CT <= HOTTEST) return;
  const hours = (seconds / 3600).toFixed(1);
  throw new OceanError(
    "INVALID_INPUT",
    `After ${hours} h a layer of ${layerDepth} m would pass ${HOTTEST} °C: it is too thin for this heat flux, or the flux is wrong.`,
  );
}

function requireBearableSalinity(SA: number, seconds: number, layerDepth: number): void {
  if (SA <= SALTIEST) return;
  const hours = (seconds / 3600).toFixed(1);
  throw new OceanError(
    "INVALID_INPUT",
    `After ${hours} h evaporation would bring a layer of ${layerDepth} m past ${SALTIEST} g/kg: it is too thin for this much, or the evaporation is wrong.`,
  );
}

function intervalHeat(
  forcing: Forcing,
  method: ResolvedMethod,
  k: number,
  passing: number,
  CT: number,
  SA: number,
): number {
  const net = fluxOver(forcing, forcing.netHeat, k);
  const passed = forcing.shortwave && passing > 0 ? passing * fluxOver(forcing, forcing.shortwave, k) : 0;
  if (!method.rainHeat || forcing.rain[k] === 0) return net - passed;
  const dt = forcing.seconds[k + 1] - forcing.seconds[k];
  return net - passed - dt * assumedRainHeatLoss(forcing.rain[k], potentialFromConservative(SA, CT));
}

/** Water lost over interval k, m: as given, or from the latent heat flux where none is given. */
export function evaporated(forcing: Forcing, k: number, CT: number, SA: number): number {
  const dt = forcing.seconds[k + 1] - forcing.seconds[k];
  if (forcing.evaporation) return forcing.evaporation[k] * dt;
  if (!forcing.latent) return 0;
  const meanLoss = -fluxOver(forcing, forcing.latent, k) / dt;
  return evaporationRate(meanLoss, potentialFromConservative(SA, CT)) * dt;
}
