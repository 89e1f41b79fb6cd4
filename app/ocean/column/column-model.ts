import { requireFinite, requireNotNegative, requirePositive } from "../guards";
import { mixInBulk } from "./bulk-mixing";
import { renewDensity, type ColumnState } from "./column-state";
import { mixAtGradients } from "./gradient-mixing";
import { LeastInterface } from "./least-interface";
import { mixStatically } from "./static-mixing";

export interface ColumnSetting {
  /** Coriolis parameter, 1/s; may be zero. */
  f: number;
  /** kg/m³ */
  waterDensity: number;
  /** J/kg/K */
  heatCapacity: number;
  /** m/s² */
  gravity: number;
  bulkRichardson: number;
  gradientRichardson: number;
  gradientMixing: boolean;
  /** Linear damping of currents, 1/s. */
  dampingRate: number;
  /** Quadratic drag of the bed; 0 where the column does not reach it. */
  bottomDrag: number;
  /** Share of the net shortwave radiation that each cell takes, adding up to 1. */
  lightShares: Float64Array;
  /** Salinity that rain and evaporation act on, g/kg: that of the surface at the start. */
  referenceSalinity: number;
}

/** Forcing at the middle of a step. */
export interface ColumnForcing {
  /** N/m² */
  tauX: number;
  tauY: number;
  /** Net heat less shortwave, W/m², positive into the sea. */
  nonSolarHeat: number;
  /** Net shortwave, W/m². */
  shortwave: number;
  /** Rain less evaporation, m/s. */
  freshWater: number;
}

/** Density this close to the surface's belongs to the layer, kg/m³. */
const SAME_DENSITY = 1e-4;

/**
 * One-dimensional column whose layer mixes by Richardson numbers. A step: heat and salt; static mixing; half a
 * rotation, stress over the layer, damping and bed friction, half a rotation; bulk mixing; gradient mixing; static
 * mixing. All mixing is averaging, so heat, salt and momentum are kept to rounding. Valid at the equator.
 * The layer used inside is not the mixed layer to report: see `mixedLayerDepth`.
 * @see Price, Weller & Pinkel (1986), Journal of Geophysical Research 91:8411-8427
 */
export class ColumnModel {
  readonly state: ColumnState;
  /** Momentum that the bed and damping took, per ρ0, m²/s. */
  lostX = 0;
  lostY = 0;
  /** Exchanges of gradient mixing so far. */
  exchanges = 0;
  private readonly setting: ColumnSetting;
  private readonly search: LeastInterface;

  /** @throws OceanError INVALID_INPUT */
  constructor(state: ColumnState, setting: ColumnSetting) {
    const { f, waterDensity, heatCapacity, gravity, bulkRichardson, gradientRichardson, dampingRate, bottomDrag } =
      setting;
    requireFinite({ f });
    requirePositive({ waterDensity, heatCapacity, gravity, bulkRichardson, gradientRichardson });
    requireNotNegative({ dampingRate, bottomDrag });
    this.state = state;
    this.setting = setting;
    this.search = new LeastInterface(state.cells - 1);
  }

  /** Moves on by `dt` seconds. @throws OceanError INVALID_INPUT, NOT_CONVERGED */
  step(dt: number, forcing: ColumnForcing): void {
    const { state, setting } = this;
    const { tauX, tauY, nonSolarHeat, shortwave, freshWater } = forcing;
    if (!Number.isFinite(dt + tauX + tauY + nonSolarHeat + shortwave + freshWater)) requireFinite({ dt, ...forcing });
    this.takeHeatAndSalt(dt, forcing);
    mixStatically(state);
    const layer = this.layerCells();
    this.push(dt, forcing, layer);
    mixInBulk(state, layer, setting.bulkRichardson, setting.gravity / setting.waterDensity);
    if (setting.gradientMixing) {
      const scaled = (setting.gravity * state.cellSize) / setting.waterDensity;
      this.exchanges += mixAtGradients(state, this.search, setting.gradientRichardson, scaled);
    }
    mixStatically(state);
  }

  private takeHeatAndSalt(dt: number, { nonSolarHeat, shortwave, freshWater }: ColumnForcing): void {
    const { state, setting } = this;
    const { T, S, cells, cellSize } = state;
    const perHeat = dt / (setting.waterDensity * setting.heatCapacity * cellSize);
    const shares = setting.lightShares;
    if (shortwave !== 0) {
      const warming = shortwave * perHeat;
      for (let k = 0; k < cells; k++) T[k] += warming * shares[k];
    }
    T[0] += nonSolarHeat * perHeat;
    S[0] -= (setting.referenceSalinity * freshWater * dt) / cellSize;
    renewDensity(state, 0, shortwave === 0 ? 1 : cells);
  }

  /** Cells from the surface that share its density. */
  private layerCells(): number {
    const { rho, cells } = this.state;
    for (let k = 1; k < cells; k++) if (Math.abs(rho[k] - rho[0]) > SAME_DENSITY) return k;
    return cells;
  }

  private push(dt: number, { tauX, tauY }: ColumnForcing, layer: number): void {
    const { state, setting } = this;
    const { u, v, cells, cellSize } = state;
    const angle = (setting.f * dt) / 2;
    const cos = Math.cos(angle);
    const sin = Math.sin(angle);
    const perStress = dt / (setting.waterDensity * layer * cellSize);
    rotate(u, v, cells, cos, sin);
    for (let k = 0; k < layer; k++) {
      u[k] += tauX * perStress;
      v[k] += tauY * perStress;
    }
    if (setting.dampingRate > 0) this.brake(0, cells, Math.exp(-setting.dampingRate * dt), cos, sin);
    if (setting.bottomDrag > 0) {
      const touching = layer === cells;
      const thickness = touching ? layer * cellSize : cellSize;
      const bedSpeed = Math.hypot(u[cells - 1], v[cells - 1]);
      this.brake(touching ? 0 : cells - 1, cells, 1 / (1 + (setting.bottomDrag * bedSpeed * dt) / thickness), cos, sin);
    }
    rotate(u, v, cells, cos, sin);
  }

  /** Slows cells from…to - 1 to a share of their speed; what is taken is kept, turned on to the end of the step. */
  private brake(from: number, to: number, share: number, cos: number, sin: number): void {
    const { u, v, cellSize } = this.state;
    let sumU = 0;
    let sumV = 0;
    for (let k = from; k < to; k++) {
      sumU += u[k];
      sumV += v[k];
      u[k] *= share;
      v[k] *= share;
    }
    const takenX = (1 - share) * sumU * cellSize;
    const takenY = (1 - share) * sumV * cellSize;
    this.lostX += takenX * cos + takenY * sin;
    this.lostY += takenY * cos - takenX * sin;
  }
}

/** Turns every cell's current clockwise by the angle of `cos` and `sin`: e^(-i angle). */
function rotate(u: Float64Array, v: Float64Array, cells: number, cos: number, sin: number): void {
  for (let k = 0; k < cells; k++) {
    const east = u[k];
    u[k] = east * cos + v[k] * sin;
    v[k] = v[k] * cos - east * sin;
  }
}
