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
  u = 0;
  v = 0;
  x = 0;
  y = 0;
  private readonly setting: SlabSetting;
  private weightedStep = Number.NaN;
  private e = new Float64Array(2);
  private phi1 = new Float64Array(2);
  private phi2 = new Float64Array(2);
  private phi3 = new Float64Array(2);

  /** @throws OceanError NONPOSITIVE_DEPTH or INVALID_INPUT */
  constructor(setting: SlabSetting) {
    requireFinite({ f: setting.f });
    requireNotNegative({ dampingRate: setting.dampingRate });
    requirePositive({ waterDensity: setting.waterDensity });
    requireDepth("layerDepth", setting.layerDepth);
    this.setting = setting;
  }

  /** Moves on by `dt` seconds while the stress runs from (τ₀x, τ₀y) to (τ₁x, τ₁y), N/m². */
  step(dt: number, tau0x: number, tau0y: number, tau1x: number, tau1y: number): void {
    if (dt !== this.weightedStep) this.weigh(dt);
    const { e, phi1, phi2, phi3, u, v } = this;
    const perMass = dt / (this.setting.waterDensity * this.setting.layerDepth);
    const ax = tau0x * perMass;
    const ay = tau0y * perMass;
    const bx = (tau1x - tau0x) * perMass;
    const by = (tau1y - tau0y) * perMass;
    this.x += dt * (u * phi1[0] - v * phi1[1] + ax * phi2[0] - ay * phi2[1] + bx * phi3[0] - by * phi3[1]);
    this.y += dt * (u * phi1[1] + v * phi1[0] + ax * phi2[1] + ay * phi2[0] + bx * phi3[1] + by * phi3[0]);
    this.u = u * e[0] - v * e[1] + ax * phi1[0] - ay * phi1[1] + bx * phi2[0] - by * phi2[1];
    this.v = u * e[1] + v * e[0] + ax * phi1[1] + ay * phi1[0] + bx * phi2[1] + by * phi2[0];
  }

  private weigh(dt: number): void {
    requirePositive({ dt });
    const xr = this.setting.dampingRate * dt;
    const xi = this.setting.f * dt;
    const decay = Math.exp(-xr);
    this.e[0] = decay * Math.cos(xi);
    this.e[1] = -decay * Math.sin(xi);
    if (Math.hypot(xr, xi) < SMALL) {
      seriesInto(this.phi1, xr, xi, 1);
      seriesInto(this.phi2, xr, xi, 2);
      seriesInto(this.phi3, xr, xi, 3);
    } else {
      quotientInto(this.phi1, 1 - this.e[0], -this.e[1], xr, xi);
      quotientInto(this.phi2, 1 - this.phi1[0], -this.phi1[1], xr, xi);
      quotientInto(this.phi3, 0.5 - this.phi2[0], -this.phi2[1], xr, xi);
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
