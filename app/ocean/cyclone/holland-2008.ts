import { requireFinite, requireLatitude, requireNotNegative, requirePositive } from "../guards";
import { power } from "../power";

export interface Holland2008Input {
  /** hPa */
  pressureDeficitHpa: number;
  /** Change of central pressure, hPa/h; negative while deepening. */
  deepeningHpaPerHour: number;
  /** degrees */
  latitude: number;
  /** m/s */
  translationSpeed: number;
  /** Surface air density, kg/m³. */
  airDensity: number;
}

/**
 * Surface shape b_s and greatest surface wind from pressure alone.
 * @returns bs within 0.5…2.5; vms m/s
 * @throws OceanError INVALID_INPUT
 * @see Holland (2008), Monthly Weather Review 136:3432-3445 (read in two public codes)
 */
export function holland2008(input: Holland2008Input): { bs: number; vms: number } {
  const { pressureDeficitHpa: dp, deepeningHpaPerHour, latitude, translationSpeed, airDensity } = input;
  requirePositive({ pressureDeficitHpa: dp, airDensity });
  requireFinite({ deepeningHpaPerHour });
  requireNotNegative({ translationSpeed });
  requireLatitude(latitude);
  const x = 0.6 * (1 - dp / 215);
  const raw =
    -4.4e-5 * dp * dp +
    0.01 * dp +
    0.03 * deepeningHpaPerHour -
    0.014 * Math.abs(latitude) +
    0.15 * power(translationSpeed, x) +
    1;
  const bs = Math.min(2.5, Math.max(0.5, raw));
  return { bs, vms: Math.sqrt((bs * dp * 100) / (airDensity * Math.E)) };
}
