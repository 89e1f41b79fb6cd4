import type { MethodSource } from "../method-source";
import { symbols } from "./symbols";

export const COLUMN: readonly MethodSource[] = [
  {
    id: "column",
    group: "column",
    title: "One-dimensional column with Richardson-number mixing",
    citation: "Price, Weller & Pinkel (1986), Journal of Geophysical Research 91:8411-8427",
    equation: "mix while g Δρ h/(ρ0 |Δw|²) < 0.65 at the layer's base and while g Δρ Δz/(ρ0 |Δw|²) < 0.25 within",
    tex: [
      String.raw`R_b = \frac{g\,\Delta\rho\,h}{\rho_0\,|\Delta w|^2} \ge 0.65 \quad \text{at the base of the layer}`,
      String.raw`R_g = \frac{g\,\Delta\rho\,\Delta z}{\rho_0\,|\Delta w|^2} \ge 0.25 \quad \text{within}`,
    ],
    symbols: symbols(["Δρ", "density step", "kg/m³"], ["Δw", "velocity step", "m/s"], ["h", "layer depth", "m"]),
    validRange: "open water; no upwelling, no advection",
    provenance: "from memory",
    remark:
      "The critical numbers agree with those in the abstract of Price (1979). Time step and cell size move the cooling by some per cent in a smooth profile, and by up to a seventh at a sharp interface (measured here).",
  },
  {
    id: "mixed-layer",
    group: "column",
    title: "Mixed-layer depth",
    citation: "de Boyer Montégut et al. (2004), Journal of Geophysical Research 109:C12003",
    equation: "σ0(h) = σ0(surface) + 0.03 kg/m³",
    tex: [String.raw`\sigma_0(h) = \sigma_0(\text{surface}) + 0.03\ \mathrm{kg\,m^{-3}}`],
    symbols: symbols(["h", "mixed-layer depth", "m"], ["σ0", "potential density less 1000", "kg/m³"]),
    validRange: "a density step of 0.03 or 0.125 kg/m³",
    provenance: "from memory",
    remark: "Linear between levels. The layer that the column mixes inside is not this one.",
  },
  {
    id: "equivalent-depth",
    group: "column",
    title: "Depth of a slab that did the same work",
    citation: "potential energy of a mixed layer in linear stratification (derived here)",
    equation: "h = (12 ΔPE/(ρ0 N²))^(1/3)",
    tex: [String.raw`h = \left(\frac{12\,\Delta PE}{\rho_0 N^2}\right)^{1/3}`],
    symbols: symbols(["ΔPE", "potential energy gained", "J/m²"], ["N", "buoyancy frequency at the start", "1/s"]),
    validRange: "linear stratification at the start",
    provenance: "independent computation",
    remark: "",
  },
];
