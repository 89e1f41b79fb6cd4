import { requireFinite, requireNotNegative, requirePositive } from "../guards";
import { power } from "../power";

export interface Holland2010Profile {
  /** Greatest surface wind, m/s. */
  vms: number;
  /** m */
  radiusOfMaximumWind: number;
  bs: number;
  /** Exponent at the outer observation and its radius, m; null where there is none. */
  xn: number;
  rn: number | null;
}

/**
 * Surface wind at a distance from the centre; already at the surface, so not to be reduced again.
 * @param r m, ≥ 0
 * @returns m/s
 * @throws OceanError INVALID_INPUT
 * @see Holland, Belanger & Fritz (2010), Monthly Weather Review 138:4393-4401
 */
export function holland2010({ vms, radiusOfMaximumWind: Rm, bs, xn, rn }: Holland2010Profile, r: number): number {
  requireNotNegative({ vms, r, xn });
  requirePositive({ Rm, bs });
  if (rn !== null) {
    requireFinite({ rn });
    requirePositive({ outerDistance: rn - Rm });
  }
  if (r === 0) return 0;
  const x = r <= Rm || rn === null ? 0.5 : 0.5 + ((r - Rm) * (xn - 0.5)) / (rn - Rm);
  const shape = power(Rm / r, bs);
  const profile = shape === Number.POSITIVE_INFINITY ? 0 : shape * Math.exp(1 - shape);
  return vms * power(profile, Math.max(0, x));
}
