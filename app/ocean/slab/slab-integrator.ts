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
    if (dt !== this.weightedStep) this.weigh(dt);
    if (!Number.isFinite(tau0x + tau0y + tau1x + tau1y)) requireFinite({ tau0x, tau0y, tau1x, tau1y });
    const { u, v, weights: w } = this;
    const perMass = dt / this.mass;
    const ax = tau0x * perMass;
    const ay = tau0y * perMass;
    const bx = (tau1x - tau0x) * perMass;
    const by = (tau1y - tau0y) * perMass;
    this.x += dt * (u * w[2] - v * w[3] + ax * w[4] - ay * w[5] + bx * w[6] - by * w[7]);
    this.y += dt * (u * w[3] + v * w[2] + ax * w[5] + ay * w[4] + bx * w[7] + by * w[6]);
    this.u = u * w[0] - v * w[1] + ax * w[2] - ay * w[3] + bx * w[4] - by * w[5];
    this.v = u * w[1] + v * w[0] + ax * w[3] + ay * w[2] + bx * w[5] + by * w[4];
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
      const phi = weights.subarray(2 * n, 2 * n + 2);
      if (small) seriesInto(phi, xr, xi, n);
      else quotientInto(phi, PHI_AT_ZERO[n - 1] - weights[2 * n - 2], -weights[2 * n - 1], xr, xi);
    }
    this.weightedStep = dt;
  }
}

/** φ_n(x) = Σ (-x)^k/(k+n)! for a small complex x. */
function seriesInto(out: Float64Array, xr: number, xi: number, n: number): void {
  let factorial = 1;
  for (let k = 2; k <= n; k++) factorial *= k;
  let re = 1 / factorial;
  let im = 0;
  out[0] = re;
  out[1] = im;
  for (let k = 1; k <= SERIES_TERMS; k++) {
    const nextRe = -(re * xr - im * xi) / (k + n);
    im = -(re * xi + im * xr) / (k + n);
    re = nextRe;
    out[0] += re;
    out[1] += im;
  }
}

function quotientInto(out: Float64Array, ar: number, ai: number, br: number, bi: number): void {
  const size = br * br + bi * bi;
  out[0] = (ar * br + ai * bi) / size;
  out[1] = (ai * br - ar * bi) / size;
}
