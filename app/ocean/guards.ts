import { SALTIEST } from "./constants";
import { OceanError } from "./errors";

/** @throws OceanError INVALID_INPUT unless every named value is a finite number. */
export function requireFinite(values: Readonly<Record<string, number>>): void {
  for (const name in values) {
    if (!Number.isFinite(values[name])) {
      throw new OceanError("INVALID_INPUT", `${name} must be a finite number, not ${String(values[name])}.`);
    }
  }
}

/** @throws OceanError INVALID_INPUT unless every named value is finite and not negative. */
export function requireNotNegative(values: Readonly<Record<string, number>>): void {
  requireFinite(values);
  for (const name in values) {
    if (values[name] < 0) {
      throw new OceanError("INVALID_INPUT", `${name} must not be negative; it is ${values[name]}.`);
    }
  }
}

/** @throws OceanError INVALID_INPUT unless every named value is finite and greater than zero. */
export function requirePositive(values: Readonly<Record<string, number>>): void {
  requireFinite(values);
  for (const name in values) {
    if (values[name] <= 0) {
      throw new OceanError("INVALID_INPUT", `${name} must be greater than zero; it is ${values[name]}.`);
    }
  }
}

/** @throws OceanError NONPOSITIVE_DEPTH unless the depth in m is greater than zero; INVALID_INPUT if it is no number. */
export function requireDepth(name: string, metres: number): void {
  requireFinite({ [name]: metres });
  if (metres <= 0) {
    throw new OceanError("NONPOSITIVE_DEPTH", `${name} must be greater than 0 m; it is ${metres} m.`);
  }
}

/** @throws OceanError INVALID_INPUT unless -90 ≤ latitude ≤ 90 degrees. */
export function requireLatitude(latitude: number): void {
  requireFinite({ latitude });
  if (Math.abs(latitude) > 90) {
    throw new OceanError("INVALID_INPUT", `latitude must lie between -90 and 90 degrees; it is ${latitude}.`);
  }
}

/** Nearer to the equator than this, nothing that divides by the Coriolis parameter is computed. degrees */
export const EQUATORIAL_LIMIT = 2;
/** Nearer than this such results are given with a caution. degrees */
export const EQUATORIAL_MARGIN = 5;

/** @throws OceanError EQUATORIAL within 2 degrees of the equator; INVALID_INPUT for no latitude at all. */
export function requireRotation(latitude: number): void {
  requireLatitude(latitude);
  if (Math.abs(latitude) < EQUATORIAL_LIMIT) {
    throw new OceanError(
      "EQUATORIAL",
      `At latitude ${latitude}° the Coriolis parameter is too small for a steady Ekman balance; use the slab or the column model.`,
    );
  }
}

/** @throws OceanError INVALID_INPUT unless SA lies within 0…60 g/kg and CT and p are numbers with p ≥ 0 dbar. */
export function requireSeawater(SA: number, temperature: number, p: number): void {
  requireFinite({ temperature });
  requireNotNegative({ SA, p });
  if (SA > SALTIEST) {
    throw new OceanError("INVALID_INPUT", `Absolute Salinity must not exceed ${SALTIEST} g/kg; it is ${SA}.`);
  }
}
