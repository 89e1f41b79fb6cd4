import { requireDepth, requireFinite, requireNotNegative, requirePositive } from "../guards";

export interface SlabSetting {
  /** Coriolis parameter, 1/s; may be zero. */
  f: number;
  /** Linear damping, 1/s, ≥ 0. */
  dampingRate: number;
  /** Depth of the layer, m. */
  layerDepth: number;
  /** kg/m³ */
  waterDensity: number;
}

/** Stress at n times, N/m², east and north; times in s, increasing. */
export interface StressKnots {
  seconds: Float64Array;
  x: Float64Array;
  y: Float64Array;
}

/** Velocity, m/s, and displacement, m, towards east and north, at n times. */
export interface SlabPath {
  u: Float64Array;
  v: Float64Array;
  x: Float64Array;
  y: Float64Array;
}

/** Room for a slab's path through n knots. */
export function slabPath(n: number): SlabPath {
  return { u: new Float64Array(n), v: new Float64Array(n), x: new Float64Array(n), y: new Float64Array(n) };
}

/** Below this size of (r + if)Δt the weights are summed as series: the closed forms lose digits. */
const SMALL = 1e-2;
const SERIES_TERMS = 9;
/** φ₀, φ₁ and φ₂ at x = 0: each φ is what is left of it of the one before, over x. */
const PHI_AT_ZERO = [1, 1, 0.5] as const;

/**
 * Wind-driven motion of a slab: dZ/dt + (if + r) Z = τ/(ρH), Z = u + iv, exact for a stress that runs linearly
 * through each step. Unconditionally stable; valid at the equator.
 *
 * Over a step Δt with x = (r + if)Δt:
 *   Z₁ = Z₀ e⁻ˣ + (Δt/ρH)[τ₀ φ₁ + (τ₁ - τ₀) φ₂]
 *   X₁ = X₀ + Z₀ Δt φ₁ + (Δt²/ρH)[τ₀ φ₂ + (τ₁ - τ₀) φ₃]
 *   φ₁ = (1 - e⁻ˣ)/x,  φ₂ = (1 - φ₁)/x,  φ₃ = (1/2 - φ₂)/x
 *
 * Velocities in m/s and displacements in m, east and north; stress in N/m².
 * @see Pollard & Millard (1970), Deep-Sea Research 17:813-821
 */
export class SlabIntegrator {
  /** Velocity, m/s, and displacement, m, towards east and north. */
  u = 0;
  v = 0;
  x = 0;
  y = 0;
  private readonly setting: SlabSetting;
  private readonly mass: number;
  /** e⁻ˣ, φ₁, φ₂, φ₃: real and imaginary part of each. */
  private readonly weights = new Float64Array(8);
  private weightedStep = Number.NaN;

  /** @throws OceanError NONPOSITIVE_DEPTH or INVALID_INPUT */
  constructor(setting: SlabSetting) {
    requireFinite({ f: setting.f });
    requireNotNegative({ dampingRate: setting.dampingRate });
    requirePositive({ waterDensity: setting.waterDensity });
    requireDepth("layerDepth", setting.layerDepth);
    this.setting = setting;
    this.mass = setting.waterDensity * setting.layerDepth;
  }

  /** Starts from a velocity (m/s) and a displacement (m) other than rest. @throws OceanError INVALID_INPUT */
  startFrom(u: number, v: number, x: number, y: number): void {
    requireFinite({ u, v, x, y });
    this.u = u;
    this.v = v;
    this.x = x;
    this.y = y;
  }

  /** Moves on by `dt` seconds while the stress runs from (τ₀x, τ₀y) to (τ₁x, τ₁y), N/m². @throws OceanError INVALID_INPUT */
  step(dt: number, tau0x: number, tau0y: number, tau1x: number, tau1y: number): void {
    requirePositive({ dt });
    requireFinite({ tau0x, tau0y, tau1x, tau1y });
    const knots = {
      seconds: Float64Array.of(0, dt),
      x: Float64Array.of(tau0x, tau1x),
      y: Float64Array.of(tau0y, tau1y),
    };
    this.follow(knots, slabPath(2));
  }

  /**
   * Moves on through a stress that runs linearly between its knots, unchecked but for its intervals, and writes where it
   * is at each knot into `path`: no allocation, for long records and ensembles.
   * @throws OceanError INVALID_INPUT where times do not increase
   */
  follow({ seconds, x: tauX, y: tauY }: StressKnots, path: SlabPath): void {
    const { weights: w, mass } = this;
    let { u, v, x, y } = this;
    const { u: pathU, v: pathV, x: pathX, y: pathY } = path;
    pathU[0] = u;
    pathV[0] = v;
    pathX[0] = x;
    pathY[0] = y;
    for (let from = 0; from + 1 < seconds.length;) {
      // All steps of one length in a row, so that their weights are read once: e⁻ˣ, φ₁, φ₂, φ₃ and Δt/ρH.
      const dt = seconds[from + 1] - seconds[from];
      let to = from + 1;
      while (to + 1 < seconds.length && seconds[to + 1] - seconds[to] === dt) to++;
      if (dt !== this.weightedStep) this.weigh(dt);
      const er = w[0];
      const ei = w[1];
      const ar = w[2];
      const ai = w[3];
      const br = w[4];
      const bi = w[5];
      const cr = w[6];
      const ci = w[7];
      const perMass = dt / mass;
      for (let k = from + 1; k <= to; k++) {
        const startX = tauX[k - 1] * perMass;
        const startY = tauY[k - 1] * perMass;
        const changeX = tauX[k] * perMass - startX;
        const changeY = tauY[k] * perMass - startY;
        x += dt * (u * ar - v * ai + startX * br - startY * bi + changeX * cr - changeY * ci);
        y += dt * (u * ai + v * ar + startX * bi + startY * br + changeX * ci + changeY * cr);
        const east = u;
        u = east * er - v * ei + startX * ar - startY * ai + changeX * br - changeY * bi;
        v = east * ei + v * er + startX * ai + startY * ar + changeX * bi + changeY * br;
        pathU[k] = u;
        pathV[k] = v;
        pathX[k] = x;
        pathY[k] = y;
      }
      from = to;
    }
    this.u = u;
    this.v = v;
    this.x = x;
    this.y = y;
  }

  private weigh(dt: number): void {
    requirePositive({ dt });
    const { weights } = this;
    const xr = this.setting.dampingRate * dt;
    const xi = this.setting.f * dt;
    const decay = Math.exp(-xr);
    weights[0] = decay * Math.cos(xi);
    weights[1] = -decay * Math.sin(xi);
    const small = Math.hypot(xr, xi) < SMALL;
    for (let n = 1; n <= 3; n++) {
      if (small) seriesInto(weights, n, xr, xi);
      else quotientInto(weights, n, PHI_AT_ZERO[n - 1] - weights[2 * n - 2], -weights[2 * n - 1], xr, xi);
    }
    this.weightedStep = dt;
  }
}

/** Weight n of the series φ_n(x) = Σ (-x)^k/(k+n)! for a small complex x. */
function seriesInto(weights: Float64Array, n: number, xr: number, xi: number): void {
  let factorial = 1;
  for (let k = 2; k <= n; k++) factorial *= k;
  let re = 1 / factorial;
  let im = 0;
  let sumRe = re;
  let sumIm = 0;
  for (let k = 1; k <= SERIES_TERMS; k++) {
    const nextRe = -(re * xr - im * xi) / (k + n);
    im = -(re * xi + im * xr) / (k + n);
    re = nextRe;
    sumRe += re;
    sumIm += im;
  }
  weights[2 * n] = sumRe;
  weights[2 * n + 1] = sumIm;
}

/** Weight n as the complex quotient a/b. */
function quotientInto(weights: Float64Array, n: number, ar: number, ai: number, br: number, bi: number): void {
  const size = br * br + bi * bi;
  weights[2 * n] = (ar * br + ai * bi) / size;
  weights[2 * n + 1] = (ai * br - ar * bi) / size;
}
