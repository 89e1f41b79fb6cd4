import { formatNumber, formatQuantity } from "~/units/format-quantity";
import type { UnitChoices } from "~/units/unit-choices";
import { gramsPerKilogram, layerDensities, type SalinityScale, type TwoLayers } from "./water-density";

export interface PresentedLayer {
  temperature: string;
  salinity: string;
  density: string;
}

/** A two-layer column in words, in the organisation's units. */
export interface PresentedColumn {
  layer: PresentedLayer;
  layerDepth: string;
  /** Null where nothing is known of it. */
  below: PresentedLayer | null;
  densityStep: string | null;
  stable: boolean;
}

export function presentColumn(column: TwoLayers, units: UnitChoices): PresentedColumn {
  const { temperature, salinity, salinityScale, layerDepth, below } = column;
  const densities = layerDensities(column);
  return {
    layer: presentLayer(temperature, salinity, salinityScale, densities.layer, units),
    layerDepth: formatQuantity(layerDepth, "layerDepth", units).text,
    below:
      below && densities.below !== null
        ? presentLayer(below.temperature, below.salinity, salinityScale, densities.below, units)
        : null,
    densityStep:
      densities.step === null ? null : formatQuantity(densities.step, "densityStep", units, { sign: true }).text,
    stable: densities.stable,
  };
}

function presentLayer(
  temperature: number,
  salinity: number,
  scale: SalinityScale,
  sigma0: number,
  units: UnitChoices,
): PresentedLayer {
  return {
    temperature: formatQuantity(temperature, "temperature", units, { decimals: 2 }).text,
    salinity: formatQuantity(gramsPerKilogram(salinity, scale), "salinity", units, { decimals: 2 }).text,
    density: `σ0 ${formatNumber(sigma0, 2)} kg/m³`,
  };
}
