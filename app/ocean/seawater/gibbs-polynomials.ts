import { ENTROPY_PART, ENTROPY_PART_SURFACE, GIBBS_CURVATURE_SURFACE, POTENTIAL_ENTHALPY } from "./gibbs-coefficients";
import { polynomial2, polynomial3, type Terms } from "./polynomial";

/** ∂/∂y of a polynomial in x and y. */
function slopeInY(terms: Terms): Terms {
  return terms.filter(([, j]) => j > 0).map(([i, j, c]) => [i, j - 1, j * c]);
}

/** Potential enthalpy, J/kg, of x = √(SALINITY_SCALE·SA) and y = θ/40, and its slope with y. */
export const potentialEnthalpy = polynomial2(POTENTIAL_ENTHALPY);
export const potentialEnthalpySlope = polynomial2(slopeInY(POTENTIAL_ENTHALPY));

const entropy = polynomial3(ENTROPY_PART);
const entropyAtSurface = polynomial2(ENTROPY_PART_SURFACE);
const curvatureAtSurface = polynomial2(GIBBS_CURVATURE_SURFACE);

/** Entropy less the part of salinity alone, J/kg/K, at z = p/10⁴. */
export const entropyPart = (x: number, y: number, z: number) => -entropy(x, y, z) / 40;
/** The same at the surface. */
export const entropyPartAtSurface = (x: number, y: number) => -entropyAtSurface(x, y) / 40;
/** Second slope of the Gibbs function with temperature at the surface, J/kg/K². */
export const gibbsCurvatureAtSurface = (x: number, y: number) => curvatureAtSurface(x, y) / 1600;
