/**
 * Specific volume of seawater as a polynomial of 75 terms (TEOS-10), and its slopes.
 *
 * v = Σ V_abk s^a y^b z^k   with   s = √(SA·SALINITY_SCALE + SALINITY_OFFSET),  y = CT/40,  z = p/10⁴
 *
 *   SA  Absolute Salinity        g/kg   0…42
 *   CT  Conservative Temperature °C    -2…40
 *   p   sea pressure             dbar   0…8000
 *   v   specific volume          m³/kg
 *
 * Source: Roquet, Madec, McDougall & Barker (2015), Ocean Modelling 90:29-43, doi:10.1016/j.ocemod.2015.04.002.
 *
 * The row `vbk` is Σ_a V_abk s^a; its digits are the powers of y and z, and its coefficients stand in order of the power
 * of s. They are written into the formulas because that is several times faster than a walk over a table, and the
 * column model evaluates this some ten million times in a storm. `specific-volume.test.ts` holds the copies together.
 */
export const SALINITY_SCALE = 0.0248826675584615;
export const SALINITY_OFFSET = 0.5971840214030754;

/**
 * Specific volume at the sea surface (p = 0), m³/kg: the reduced polynomial that the column model walks over.
 * @param SA g/kg, ≥ 0 @param CT °C
 */
export function surfaceSpecificVolume(SA: number, CT: number): number {
  const s = Math.sqrt(SA * 0.0248826675584615 + 0.5971840214030754);
  const y = CT * 0.025;

  const v00 =
    0.0010769995862 +
    s *
      (-0.00031038981976 +
        s *
          (0.00066928067038 +
            s * (-0.00085047933937 + s * (0.00058086069943 + s * (-0.00021092370507 + s * 3.1932457305e-5)))));
  const v10 =
    -1.5649734675e-5 +
    s *
      (3.5009599764e-5 + s * (-4.3592678561e-5 + s * (3.4532461828e-5 + s * (-1.1959409788e-5 + s * 1.3864594581e-6))));
  const v20 =
    2.7762106484e-5 + s * (-3.7435842344e-5 + s * (3.590782276e-5 + s * (-1.8698584187e-5 + s * 3.8595339244e-6)));
  const v30 = -1.6521159259e-5 + s * (2.4141479483e-5 + s * (-1.4353633048e-5 + s * 2.2863324556e-6));
  const v40 = 6.9111322702e-6 + s * (-8.7595873154e-6 + s * 4.3703680598e-6);
  const v50 = -8.053961554e-7 + s * -3.30527589e-7;
  const v60 = 2.0543094268e-7;
  return v00 + y * (v10 + y * (v20 + y * (v30 + y * (v40 + y * (v50 + y * v60)))));
}

/** Specific volume, m³/kg, and its slopes with Conservative Temperature, m³/kg/K, and Absolute Salinity, m³/kg/(g/kg). */
export interface SpecificVolumeSlopes {
  v: Float64Array;
  dvdCT: Float64Array;
  dvdSA: Float64Array;
}

/** Room for the slopes at n points. */
export function specificVolumeSlopes(n: number): SpecificVolumeSlopes {
  return { v: new Float64Array(n), dvdCT: new Float64Array(n), dvdSA: new Float64Array(n) };
}

/** Specific volume and its slopes at one point; units as `SpecificVolumeSlopes`. @param SA g/kg, ≥ 0 @param CT °C @param p dbar */
export function specificVolumeAt(SA: number, CT: number, p: number): { v: number; dvdCT: number; dvdSA: number } {
  const out = specificVolumeSlopes(1);
  specificVolumeSlopesInto(out, Float64Array.of(SA), Float64Array.of(CT), Float64Array.of(p));
  return { v: out.v[0], dvdCT: out.dvdCT[0], dvdSA: out.dvdSA[0] };
}

/**
 * Writes specific volume and its slopes at every point into `out`: no allocation, for loops.
 * @param SA g/kg, ≥ 0 @param CT °C @param p dbar, one value a point
 */
export function specificVolumeSlopesInto(
  { v, dvdCT, dvdSA }: SpecificVolumeSlopes,
  SA: Float64Array,
  CT: Float64Array,
  p: Float64Array,
): void {
  for (let k = 0; k < SA.length; k++) {
    const s = Math.sqrt(SA[k] * 0.0248826675584615 + 0.5971840214030754);
    const y = CT[k] * 0.025;
    const z = p[k] * 1e-4;

    const v00 =
      0.0010769995862 +
      s *
        (-0.00031038981976 +
          s *
            (0.00066928067038 +
              s * (-0.00085047933937 + s * (0.00058086069943 + s * (-0.00021092370507 + s * 3.1932457305e-5)))));
    const v10 =
      -1.5649734675e-5 +
      s *
        (3.5009599764e-5 +
          s * (-4.3592678561e-5 + s * (3.4532461828e-5 + s * (-1.1959409788e-5 + s * 1.3864594581e-6))));
    const v20 =
      2.7762106484e-5 + s * (-3.7435842344e-5 + s * (3.590782276e-5 + s * (-1.8698584187e-5 + s * 3.8595339244e-6)));
    const v30 = -1.6521159259e-5 + s * (2.4141479483e-5 + s * (-1.4353633048e-5 + s * 2.2863324556e-6));
    const v40 = 6.9111322702e-6 + s * (-8.7595873154e-6 + s * 4.3703680598e-6);
    const v50 = -8.053961554e-7 + s * -3.30527589e-7;
    const v60 = 2.0543094268e-7;
    const v01 =
      -6.0799143809e-5 +
      s *
        (2.4262468747e-5 +
          s * (-3.4792460974e-5 + s * (3.7470777305e-5 + s * (-1.7322218612e-5 + s * 3.0927427253e-6))));
    const v11 =
      1.8505765429e-5 + s * (-9.5677088156e-6 + s * (1.1100834765e-5 + s * (-9.8447117844e-6 + s * 2.590922526e-6)));
    const v21 = -1.1716606853e-5 + s * (-2.3678308361e-7 + s * (2.9283346295e-6 + s * -4.88261392e-7));
    const v31 = 7.9279656173e-6 + s * (-3.4558773655e-6 + s * 3.1655306078e-7);
    const v41 = -3.4102187482e-6 + s * 1.2956717783e-6;
    const v51 = 5.0736766814e-7;
    const v02 =
      9.9856169219e-6 + s * (-5.8484432984e-7 + s * (-4.8122251597e-6 + s * (4.9263106998e-6 + s * -1.7811974727e-6)));
    const v12 = -1.1736386731e-6 + s * (-5.5699154557e-6 + s * (5.4620748834e-6 + s * -1.3544185627e-6));
    const v22 = 2.130502874e-6 + s * (3.913738708e-7 + s * -6.5731104067e-7);
    const v32 = -4.6132540037e-7 + s * 7.7618888092e-9;
    const v42 = -6.3352916514e-8;
    const v03 = -1.1309361437e-6 + s * (3.6310188515e-7 + s * 1.674630378e-8);
    const v13 = -3.6527006553e-7 + s * -2.7295696237e-7;
    const v23 = 2.8695905159e-7;
    const v04 = 1.053115308e-7 + s * -1.1147125423e-7;
    const v14 = 3.1454099902e-7;
    const v05 = -1.2647261286e-8;
    const v06 = 1.961350393e-9;

    const v0 = v00 + y * (v10 + y * (v20 + y * (v30 + y * (v40 + y * (v50 + y * v60)))));
    const v1 = v01 + y * (v11 + y * (v21 + y * (v31 + y * (v41 + y * v51))));
    const v2 = v02 + y * (v12 + y * (v22 + y * (v32 + y * v42)));
    const v3 = v03 + y * (v13 + y * v23);
    const v4 = v04 + y * v14;
    const v5 = v05;
    const v6 = v06;
    v[k] = v0 + z * (v1 + z * (v2 + z * (v3 + z * (v4 + z * (v5 + z * v6)))));

    const t0 = v10 + y * (2 * v20 + y * (3 * v30 + y * (4 * v40 + y * (5 * v50 + y * (6 * v60)))));
    const t1 = v11 + y * (2 * v21 + y * (3 * v31 + y * (4 * v41 + y * (5 * v51))));
    const t2 = v12 + y * (2 * v22 + y * (3 * v32 + y * (4 * v42)));
    const t3 = v13 + y * (2 * v23);
    const t4 = v14;
    dvdCT[k] = 0.025 * (t0 + z * (t1 + z * (t2 + z * (t3 + z * t4))));

    const h00 =
      -0.00031038981976 +
      s *
        (2 * 0.00066928067038 +
          s *
            (3 * -0.00085047933937 +
              s * (4 * 0.00058086069943 + s * (5 * -0.00021092370507 + s * (6 * 3.1932457305e-5)))));
    const h10 =
      3.5009599764e-5 +
      s * (2 * -4.3592678561e-5 + s * (3 * 3.4532461828e-5 + s * (4 * -1.1959409788e-5 + s * (5 * 1.3864594581e-6))));
    const h20 = -3.7435842344e-5 + s * (2 * 3.590782276e-5 + s * (3 * -1.8698584187e-5 + s * (4 * 3.8595339244e-6)));
    const h30 = 2.4141479483e-5 + s * (2 * -1.4353633048e-5 + s * (3 * 2.2863324556e-6));
    const h40 = -8.7595873154e-6 + s * (2 * 4.3703680598e-6);
    const h50 = -3.30527589e-7;
    const h01 =
      2.4262468747e-5 +
      s * (2 * -3.4792460974e-5 + s * (3 * 3.7470777305e-5 + s * (4 * -1.7322218612e-5 + s * (5 * 3.0927427253e-6))));
    const h11 = -9.5677088156e-6 + s * (2 * 1.1100834765e-5 + s * (3 * -9.8447117844e-6 + s * (4 * 2.590922526e-6)));
    const h21 = -2.3678308361e-7 + s * (2 * 2.9283346295e-6 + s * (3 * -4.88261392e-7));
    const h31 = -3.4558773655e-6 + s * (2 * 3.1655306078e-7);
    const h41 = 1.2956717783e-6;
    const h02 = -5.8484432984e-7 + s * (2 * -4.8122251597e-6 + s * (3 * 4.9263106998e-6 + s * (4 * -1.7811974727e-6)));
    const h12 = -5.5699154557e-6 + s * (2 * 5.4620748834e-6 + s * (3 * -1.3544185627e-6));
    const h22 = 3.913738708e-7 + s * (2 * -6.5731104067e-7);
    const h32 = 7.7618888092e-9;
    const h03 = 3.6310188515e-7 + s * (2 * 1.674630378e-8);
    const h13 = -2.7295696237e-7;
    const h04 = -1.1147125423e-7;
    const h0 = h00 + y * (h10 + y * (h20 + y * (h30 + y * (h40 + y * h50))));
    const h1 = h01 + y * (h11 + y * (h21 + y * (h31 + y * h41)));
    const h2 = h02 + y * (h12 + y * (h22 + y * h32));
    const h3 = h03 + y * h13;
    const h4 = h04;
    dvdSA[k] = ((0.5 * 0.0248826675584615) / s) * (h0 + z * (h1 + z * (h2 + z * (h3 + z * h4))));
  }
}
