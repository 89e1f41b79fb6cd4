/**
 * Coefficients of the 1980 equation of state and of its adiabatic lapse rate.
 * Source: Fofonoff & Millard (1983), UNESCO Technical Papers in Marine Science 44; lapse rate after Bryden (1973).
 * Each array is a polynomial in t68 (°C), lowest power first. `g[1]` is 1.6483e-2; copies with 1.64833e-2 are misprints.
 */
export const EOS80 = {
  smow: [999.842594, 0.06793952, -0.00909529, 0.0001001685, -1.120083e-6, 6.536332e-9],
  b: [0.824493, -0.0040899, 7.6438e-5, -8.2467e-7, 5.3875e-9],
  c: [-0.00572466, 0.00010227, -1.6546e-6],
  d: 0.00048314,
  e: [19652.21, 148.4206, -2.327105, 0.01360477, -5.155288e-5],
  f: [54.6746, -0.603459, 0.0109987, -6.167e-5],
  g: [0.07944, 0.016483, -0.00053009],
  h: [3.239908, 0.00143713, 0.000116092, -5.77905e-7],
  i: [0.0022838, -1.0981e-5, -1.6078e-6],
  j: 0.000191075,
  k: [8.50935e-5, -6.12293e-6, 5.2787e-8],
  m: [-9.9348e-7, 2.0816e-8, 9.1697e-10],
} as const;

export const LAPSE80 = {
  a: [3.5803e-5, 8.5258e-6, -6.836e-8, 6.6228e-10],
  b: [1.8932e-6, -4.2393e-8],
  c: [1.8741e-8, -6.7795e-10, 8.733e-12, -5.4481e-14],
  d: [-1.1351e-10, 2.7759e-12],
  e: [-4.6206e-13, 1.8676e-14, -2.1687e-16],
} as const;
