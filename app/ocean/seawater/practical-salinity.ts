import { OceanError } from "../errors";
import { requireFinite } from "../guards";

/** Conductivity of seawater of S = 35 at 15 °C (IPTS-68) and 0 dbar, S/m. */
const STANDARD_CONDUCTIVITY = 4.2914;

/**
 * Practical Salinity from conductivity (PSS-78).
 * @param conductivity S/m, > 0 @param t in-situ temperature, °C (ITS-90) @param p sea pressure, dbar
 * @returns Practical Salinity; stated for 2…42, -2…35 °C
 * @throws OceanError INVALID_INPUT for what is no seawater
 * @see Fofonoff & Millard (1983), UNESCO Technical Papers in Marine Science 44, section 1
 */
export function salinityFromConductivity(conductivity: number, t: number, p: number): number {
  requireFinite({ conductivity, t, p });
  if (conductivity <= 0)
    throw new OceanError("INVALID_INPUT", `Conductivity must exceed 0 S/m; it is ${conductivity}.`);
  return salinityFromRatio(conductivity / STANDARD_CONDUCTIVITY, t * 1.00024, p);
}

/**
 * Practical Salinity from the ratio of conductivities C(S, t, p)/C(35, 15, 0).
 * @param R ratio @param t68 °C (IPTS-68) @param p dbar
 */
export function salinityFromRatio(R: number, t68: number, p: number): number {
  const Rp =
    1 +
    (p * (2.07e-5 + p * (-6.37e-10 + p * 3.989e-15))) /
      (1 + t68 * (3.426e-2 + t68 * 4.464e-4) + (4.215e-1 - 3.107e-3 * t68) * R);
  const rt = 0.6766097 + t68 * (2.00564e-2 + t68 * (1.104259e-4 + t68 * (-6.9698e-7 + t68 * 1.0031e-9)));
  const x = Math.sqrt(R / (Rp * rt));
  const atFifteen = 0.008 + x * (-0.1692 + x * (25.3851 + x * (14.0941 + x * (-7.0261 + x * 2.7081))));
  const perDegree = 0.0005 + x * (-0.0056 + x * (-0.0066 + x * (-0.0375 + x * (0.0636 - x * 0.0144))));
  return atFifteen + ((t68 - 15) / (1 + 0.0162 * (t68 - 15))) * perDegree;
}
