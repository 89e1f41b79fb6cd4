import { mulberry32 } from "~/ocean/statistics/mulberry32";

/** A function of JavaScript and the arguments to try it with, from random numbers in 0…1. */
interface Tried {
  work: (x: number, y: number) => number;
  x: (u: number) => number;
  y?: (u: number) => number;
}

const between = (low: number, high: number) => (u: number) => low + (high - low) * u;

/** What the engine's numbers hang on, over more than the ranges it meets. */
export const USED_BY_THE_ENGINE: Record<string, Tried> = {
  sin: { work: Math.sin, x: between(-400, 400) },
  cos: { work: Math.cos, x: between(-400, 400) },
  exp: { work: Math.exp, x: between(-700, 700) },
  log: { work: Math.log, x: between(1e-12, 1e4) },
  log10: { work: Math.log10, x: between(1e-6, 1e5) },
  atan: { work: Math.atan, x: between(-50, 50) },
  atan2: { work: Math.atan2, x: between(-3, 3), y: between(-3, 3) },
  sqrt: { work: Math.sqrt, x: between(0, 1e6) },
  cbrt: { work: Math.cbrt, x: between(0, 1e6) },
  hypot: { work: Math.hypot, x: between(-3, 3), y: between(-3, 3) },
  square: { work: (x) => x ** 2, x: between(-3000, 3000) },
};

/** What the engine does without, since its last bits differ from one version of V8 to another. */
export const AVOIDED_BY_THE_ENGINE: Record<string, Tried> = {
  power: { work: (x, y) => x ** y, x: between(0, 100), y: between(-5, 5) },
  tanh: { work: Math.tanh, x: between(-4, 4) },
};

/** Values at a great many seeded arguments, one row a function. */
export function mathValues(functions: Record<string, Tried>, count: number): Record<string, number[]> {
  const rows = Object.entries(functions).map(([name, { work, x, y = x }]): [string, number[]] => {
    const random = mulberry32(20261104);
    return [name, Array.from({ length: count }, () => work(x(random()), y(random())))];
  });
  return Object.fromEntries(rows);
}
