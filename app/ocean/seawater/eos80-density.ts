import { requireSeawater } from "../guards";
import { EOS80 } from "./eos80-coefficients";
import { polynomial } from "./polynomial";

/** IPTS-68 temperature from ITS-90, °C. Saunders (1990). */
export function t68FromT90(t90: number): number {
  return 1.00024 * t90;
}

/**
 * Density of seawater by the 1980 equation of state: a cross-check on older records, never mixed with TEOS-10 in one profile.
 * @param S Practical Salinity, 0…42
 * @param t68 temperature on IPTS-68, °C, -2…40
 * @param p sea pressure, dbar, 0…10000
 * @returns kg/m³
 * @throws OceanError INVALID_INPUT
 * @see Fofonoff & Millard (1983)
 */
export function eos80Density(S: number, t68: number, p: number): number {
  requireSeawater(S, t68, p);
  const root = S * Math.sqrt(S);
  const at = (coefficients: readonly number[]) => polynomial(coefficients, t68);
  const surface = at(EOS80.smow) + at(EOS80.b) * S + at(EOS80.c) * root + EOS80.d * S * S;
  const bar = p / 10;
  const bulk0 = at(EOS80.e) + at(EOS80.f) * S + at(EOS80.g) * root;
  const bulk1 = at(EOS80.h) + at(EOS80.i) * S + EOS80.j * root;
  const bulk2 = at(EOS80.k) + at(EOS80.m) * S;
  const bulkModulus = bulk0 + bulk1 * bar + bulk2 * bar * bar;
  return surface / (1 - bar / bulkModulus);
}
