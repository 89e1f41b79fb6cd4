import { OceanError } from "../errors";
import { requireNotNegative, requirePositive } from "../guards";

/**
 * Ratio of the strongest mean wind over a period to the one-hour mean.
 * @param seconds averaging period, 1…36000 s
 * @throws OceanError INVALID_INPUT outside that range
 * @see Coastal Engineering Manual (USACE), section II-2 (branch above one hour read in example II-2-2; the other from memory)
 */
export function averagingFactor(seconds: number): number {
  requirePositive({ seconds });
  if (seconds < 1 || seconds > 36000) {
    throw new OceanError("INVALID_INPUT", `An averaging period must lie between 1 s and 10 h; it is ${seconds} s.`);
  }
  if (seconds <= 3600) return 1.277 + 0.296 * tanh(0.9 * Math.log10(45 / seconds));
  return -0.15 * Math.log10(seconds) + 1.5334;
}

/**
 * The same wind stated over another averaging period.
 * @param speed m/s @param fromSeconds its period, s @param toSeconds the period wanted, s
 * @returns m/s
 * @throws OceanError INVALID_INPUT
 */
export function convertAveraging(speed: number, fromSeconds: number, toSeconds: number): number {
  requireNotNegative({ speed });
  return (speed * averagingFactor(toSeconds)) / averagingFactor(fromSeconds);
}

/** By exp, on whose bits JavaScript engines agree; on those of Math.tanh they do not. */
function tanh(x: number): number {
  return 1 - 2 / (Math.exp(2 * x) + 1);
}
