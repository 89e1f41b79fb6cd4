import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { uniform as number } from "../../../tests/factories/uniform";
import { SALINITY_OFFSET, SALINITY_SCALE, specificVolumeAt, surfaceSpecificVolume } from "./specific-volume";

const seawater: [fc.Arbitrary<number>, fc.Arbitrary<number>, fc.Arbitrary<number>] = [
  number(0.1, 42),
  number(-2, 40),
  number(0, 8000),
];

const specificVolume = (SA: number, CT: number, p: number) => specificVolumeAt(SA, CT, p).v;

describe("specific volume", () => {
  it("has one and the same polynomial at the surface and below", () => {
    fc.assert(
      fc.property(seawater[0], seawater[1], (SA, CT) => {
        expect(Math.abs(surfaceSpecificVolume(SA, CT) / specificVolume(SA, CT, 0) - 1)).toBeLessThan(1e-15);
      }),
    );
  });

  it("has slopes that its own differences agree with", () => {
    fc.assert(
      fc.property(...seawater, (SA, CT, p) => {
        const step = 1e-3;
        const { dvdCT, dvdSA } = specificVolumeAt(SA, CT, p);
        const byCT = (specificVolume(SA, CT + step, p) - specificVolume(SA, CT - step, p)) / (2 * step);
        const bySA = (specificVolume(SA + step, CT, p) - specificVolume(SA - step, CT, p)) / (2 * step);
        expect(Math.abs(dvdCT - byCT)).toBeLessThan(1e-12);
        expect(Math.abs(dvdSA - bySA)).toBeLessThan(1e-12);
      }),
    );
  });

  it("names the scale and offset of salinity that stand in the formulas", () => {
    // At s = 1 the rows add up to their coefficients: the salinity where that is so comes from the two constants.
    const SA = (1 - SALINITY_OFFSET) / SALINITY_SCALE;
    const row =
      0.0010769995862 -
      0.00031038981976 +
      0.00066928067038 -
      0.00085047933937 +
      0.00058086069943 -
      0.00021092370507 +
      3.1932457305e-5;
    expect(surfaceSpecificVolume(SA, 0)).toBeCloseTo(row, 15);
  });
});
