import { OceanError, type RangeWarning } from "../errors";
import { requireSeawater } from "../guards";
import { specificVolumeAt, surfaceSpecificVolume } from "./specific-volume";

export interface SeawaterDensity {
  /** In-situ density, kg/m³. */
  rho: number;
  /** Thermal expansion with Conservative Temperature, 1/K. */
  alpha: number;
  /** Haline contraction, 1/(g/kg). */
  beta: number;
  /** Potential density referred to the surface, less 1000 kg/m³. */
  sigma0: number;
  warnings: RangeWarning[];
}

/**
 * Density of seawater with its thermal expansion and haline contraction (TEOS-10, 75 terms).
 * @param SA Absolute Salinity, g/kg: 0…42 fitted, up to 60 with a warning
 * @param CT Conservative Temperature, °C: -2…40 fitted
 * @param p sea pressure, dbar: 0…8000
 * @throws OceanError INVALID_INPUT for no number, SA < 0, SA > 60 or p < 0
 * @see Roquet, Madec, McDougall & Barker (2015)
 */
export function seawaterDensity(SA: number, CT: number, p: number): SeawaterDensity {
  requireSeawater(SA, CT, p);
  const { v, dvdCT, dvdSA } = specificVolumeAt(SA, CT, p);
  if (!(v > 0)) {
    throw new OceanError(
      "INVALID_INPUT",
      `No density at SA ${SA} g/kg, CT ${CT} °C, p ${p} dbar: far outside the fitted range.`,
    );
  }
  return {
    rho: 1 / v,
    alpha: dvdCT / v,
    beta: -dvdSA / v,
    sigma0: 1 / surfaceSpecificVolume(SA, CT) - 1000,
    warnings: densityWarnings(SA, CT, p),
  };
}

/** In-situ density, kg/m³. Arguments as `seawaterDensity`, unchecked: for loops over values already checked. */
export function densityOf(SA: number, CT: number, p: number): number {
  return 1 / specificVolumeAt(SA, CT, p).v;
}

/** Potential density referred to the surface, kg/m³. Arguments as `seawaterDensity`, unchecked. */
export function potentialDensityOf(SA: number, CT: number): number {
  return 1 / surfaceSpecificVolume(SA, CT);
}

/**
 * Potential density referred to the surface, kg/m³, of levels from…to - 1, written into `rho`: for loops.
 * @param SA g/kg @param CT °C, one value a level, unchecked
 */
export function potentialDensityInto(
  rho: Float64Array,
  SA: Float64Array,
  CT: Float64Array,
  from: number,
  to: number,
): void {
  for (let k = from; k < to; k++) rho[k] = 1 / surfaceSpecificVolume(SA[k], CT[k]);
}

function densityWarnings(SA: number, CT: number, p: number): RangeWarning[] {
  const warnings: RangeWarning[] = [];
  const outside = (name: string, value: number, low: number, high: number, unit: string) => {
    if (value >= low && value <= high) return;
    const threshold = value < low ? low : high;
    const message = `${name} ${value} ${unit} lies outside the ${low}…${high} ${unit} that the density polynomial was fitted to.`;
    warnings.push({ code: "OUT_OF_RANGE", message, value, threshold });
  };
  outside("Absolute Salinity", SA, 0, 42, "g/kg");
  outside("Conservative Temperature", CT, -2, 40, "°C");
  outside("Pressure", p, 0, 8000, "dbar");
  return warnings;
}
