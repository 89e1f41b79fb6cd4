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
 * The three digits of a name are the powers of s, y and z in that order; the coefficients stand in this file
 * because a polynomial written out over local constants is several times faster than a walk over a table.
 */
export const SALINITY_SCALE = 0.0248826675584615;
export const SALINITY_OFFSET = 0.5971840214030754;

const V000 = 0.0010769995862;
const V100 = -0.00031038981976;
const V200 = 0.00066928067038;
const V300 = -0.00085047933937;
const V400 = 0.00058086069943;
const V500 = -0.00021092370507;
const V600 = 3.1932457305e-5;
const V010 = -1.5649734675e-5;
const V110 = 3.5009599764e-5;
const V210 = -4.3592678561e-5;
const V310 = 3.4532461828e-5;
const V410 = -1.1959409788e-5;
const V510 = 1.3864594581e-6;
const V020 = 2.7762106484e-5;
const V120 = -3.7435842344e-5;
const V220 = 3.590782276e-5;
const V320 = -1.8698584187e-5;
const V420 = 3.8595339244e-6;
const V030 = -1.6521159259e-5;
const V130 = 2.4141479483e-5;
const V230 = -1.4353633048e-5;
const V330 = 2.2863324556e-6;
const V040 = 6.9111322702e-6;
const V140 = -8.7595873154e-6;
const V240 = 4.3703680598e-6;
const V050 = -8.053961554e-7;
const V150 = -3.30527589e-7;
const V060 = 2.0543094268e-7;
const V001 = -6.0799143809e-5;
const V101 = 2.4262468747e-5;
const V201 = -3.4792460974e-5;
const V301 = 3.7470777305e-5;
const V401 = -1.7322218612e-5;
const V501 = 3.0927427253e-6;
const V011 = 1.8505765429e-5;
const V111 = -9.5677088156e-6;
const V211 = 1.1100834765e-5;
const V311 = -9.8447117844e-6;
const V411 = 2.590922526e-6;
const V021 = -1.1716606853e-5;
const V121 = -2.3678308361e-7;
const V221 = 2.9283346295e-6;
const V321 = -4.88261392e-7;
const V031 = 7.9279656173e-6;
const V131 = -3.4558773655e-6;
const V231 = 3.1655306078e-7;
const V041 = -3.4102187482e-6;
const V141 = 1.2956717783e-6;
const V051 = 5.0736766814e-7;
const V002 = 9.9856169219e-6;
const V102 = -5.8484432984e-7;
const V202 = -4.8122251597e-6;
const V302 = 4.9263106998e-6;
const V402 = -1.7811974727e-6;
const V012 = -1.1736386731e-6;
const V112 = -5.5699154557e-6;
const V212 = 5.4620748834e-6;
const V312 = -1.3544185627e-6;
const V022 = 2.130502874e-6;
const V122 = 3.913738708e-7;
const V222 = -6.5731104067e-7;
const V032 = -4.6132540037e-7;
const V132 = 7.7618888092e-9;
const V042 = -6.3352916514e-8;
const V003 = -1.1309361437e-6;
const V103 = 3.6310188515e-7;
const V203 = 1.674630378e-8;
const V013 = -3.6527006553e-7;
const V113 = -2.7295696237e-7;
const V023 = 2.8695905159e-7;
const V004 = 1.053115308e-7;
const V104 = -1.1147125423e-7;
const V014 = 3.1454099902e-7;
const V005 = -1.2647261286e-8;
const V006 = 1.961350393e-9;

/**
 * Specific volume, m³/kg.
 * @param SA g/kg, ≥ 0 @param CT °C @param p dbar
 */
export function specificVolume(SA: number, CT: number, p: number): number {
  const s = Math.sqrt(SA * SALINITY_SCALE + SALINITY_OFFSET);
  const y = CT * 0.025;
  const z = p * 1e-4;

  const z0 =
    V000 +
    s * (V100 + s * (V200 + s * (V300 + s * (V400 + s * (V500 + s * V600))))) +
    y *
      (V010 +
        s * (V110 + s * (V210 + s * (V310 + s * (V410 + s * V510)))) +
        y *
          (V020 +
            s * (V120 + s * (V220 + s * (V320 + s * V420))) +
            y *
              (V030 +
                s * (V130 + s * (V230 + s * V330)) +
                y * (V040 + s * (V140 + s * V240) + y * (V050 + s * V150 + y * V060)))));
  const z1 =
    V001 +
    s * (V101 + s * (V201 + s * (V301 + s * (V401 + s * V501)))) +
    y *
      (V011 +
        s * (V111 + s * (V211 + s * (V311 + s * V411))) +
        y *
          (V021 +
            s * (V121 + s * (V221 + s * V321)) +
            y * (V031 + s * (V131 + s * V231) + y * (V041 + s * V141 + y * V051))));
  const z2 =
    V002 +
    s * (V102 + s * (V202 + s * (V302 + s * V402))) +
    y *
      (V012 +
        s * (V112 + s * (V212 + s * V312)) +
        y * (V022 + s * (V122 + s * V222) + y * (V032 + s * V132 + y * V042)));
  const z3 = V003 + s * (V103 + s * V203) + y * (V013 + s * V113 + y * V023);
  const z4 = V004 + s * V104 + y * V014;
  const z5 = V005;
  const z6 = V006;
  return z0 + z * (z1 + z * (z2 + z * (z3 + z * (z4 + z * (z5 + z * z6)))));
}

/**
 * Specific volume at the sea surface (p = 0), m³/kg: the reduced polynomial that the column model walks over.
 * @param SA g/kg, ≥ 0 @param CT °C
 */
export function surfaceSpecificVolume(SA: number, CT: number): number {
  const s = Math.sqrt(SA * SALINITY_SCALE + SALINITY_OFFSET);
  const y = CT * 0.025;
  return (
    V000 +
    s * (V100 + s * (V200 + s * (V300 + s * (V400 + s * (V500 + s * V600))))) +
    y *
      (V010 +
        s * (V110 + s * (V210 + s * (V310 + s * (V410 + s * V510)))) +
        y *
          (V020 +
            s * (V120 + s * (V220 + s * (V320 + s * V420))) +
            y *
              (V030 +
                s * (V130 + s * (V230 + s * V330)) +
                y * (V040 + s * (V140 + s * V240) + y * (V050 + s * V150 + y * V060)))))
  );
}

/**
 * Specific volume and its slopes with Conservative Temperature and Absolute Salinity, written into `out` as
 * [v m³/kg, ∂v/∂CT m³/kg/K, ∂v/∂SA m³/kg/(g/kg)]: no allocation, for loops.
 * @param SA g/kg, ≥ 0 @param CT °C @param p dbar
 */
export function specificVolumeSlopesInto(out: Float64Array, SA: number, CT: number, p: number): void {
  const s = Math.sqrt(SA * SALINITY_SCALE + SALINITY_OFFSET);
  const y = CT * 0.025;
  const z = p * 1e-4;

  const p00 = V000 + s * (V100 + s * (V200 + s * (V300 + s * (V400 + s * (V500 + s * V600)))));
  const p10 = V010 + s * (V110 + s * (V210 + s * (V310 + s * (V410 + s * V510))));
  const p20 = V020 + s * (V120 + s * (V220 + s * (V320 + s * V420)));
  const p30 = V030 + s * (V130 + s * (V230 + s * V330));
  const p40 = V040 + s * (V140 + s * V240);
  const p50 = V050 + s * V150;
  const p60 = V060;
  const p01 = V001 + s * (V101 + s * (V201 + s * (V301 + s * (V401 + s * V501))));
  const p11 = V011 + s * (V111 + s * (V211 + s * (V311 + s * V411)));
  const p21 = V021 + s * (V121 + s * (V221 + s * V321));
  const p31 = V031 + s * (V131 + s * V231);
  const p41 = V041 + s * V141;
  const p51 = V051;
  const p02 = V002 + s * (V102 + s * (V202 + s * (V302 + s * V402)));
  const p12 = V012 + s * (V112 + s * (V212 + s * V312));
  const p22 = V022 + s * (V122 + s * V222);
  const p32 = V032 + s * V132;
  const p42 = V042;
  const p03 = V003 + s * (V103 + s * V203);
  const p13 = V013 + s * V113;
  const p23 = V023;
  const p04 = V004 + s * V104;
  const p14 = V014;
  const p05 = V005;
  const p06 = V006;
  out[0] =
    p00 +
    y * (p10 + y * (p20 + y * (p30 + y * (p40 + y * (p50 + y * p60))))) +
    z *
      (p01 +
        y * (p11 + y * (p21 + y * (p31 + y * (p41 + y * p51)))) +
        z *
          (p02 +
            y * (p12 + y * (p22 + y * (p32 + y * p42))) +
            z * (p03 + y * (p13 + y * p23) + z * (p04 + y * p14 + z * (p05 + z * p06)))));
  out[1] =
    0.025 *
    (p10 +
      y * (2 * p20 + y * (3 * p30 + y * (4 * p40 + y * (5 * p50 + y * (6 * p60))))) +
      z *
        (p11 +
          y * (2 * p21 + y * (3 * p31 + y * (4 * p41 + y * (5 * p51)))) +
          z * (p12 + y * (2 * p22 + y * (3 * p32 + y * (4 * p42))) + z * (p13 + y * (2 * p23) + z * p14))));
  const d0 =
    V100 +
    s * (2 * V200 + s * (3 * V300 + s * (4 * V400 + s * (5 * V500 + s * (6 * V600))))) +
    y *
      (V110 +
        s * (2 * V210 + s * (3 * V310 + s * (4 * V410 + s * (5 * V510)))) +
        y *
          (V120 +
            s * (2 * V220 + s * (3 * V320 + s * (4 * V420))) +
            y * (V130 + s * (2 * V230 + s * (3 * V330)) + y * (V140 + s * (2 * V240) + y * V150))));
  const d1 =
    V101 +
    s * (2 * V201 + s * (3 * V301 + s * (4 * V401 + s * (5 * V501)))) +
    y *
      (V111 +
        s * (2 * V211 + s * (3 * V311 + s * (4 * V411))) +
        y * (V121 + s * (2 * V221 + s * (3 * V321)) + y * (V131 + s * (2 * V231) + y * V141)));
  const d2 =
    V102 +
    s * (2 * V202 + s * (3 * V302 + s * (4 * V402))) +
    y * (V112 + s * (2 * V212 + s * (3 * V312)) + y * (V122 + s * (2 * V222) + y * V132));
  const d3 = V103 + s * (2 * V203) + y * V113;
  const d4 = V104;
  out[2] = ((0.5 * SALINITY_SCALE) / s) * (d0 + z * (d1 + z * (d2 + z * (d3 + z * d4))));
}
