import type { MethodSource } from "../method-source";
import { symbols } from "./symbols";

export const FRESH_WATER: readonly MethodSource[] = [
  {
    id: "rain-dilution",
    group: "fresh water",
    title: "Dilution of a layer by rain",
    citation: "conservation of salt (common practice)",
    equation: "S = S0 D/(D + ∫(P - E) dt)",
    tex: [String.raw`S = \frac{S_0\,D}{D + \int (P - E)\,dt}`],
    symbols: symbols(
      ["S", "salinity", "g/kg"],
      ["D", "layer depth", "m"],
      ["P", "rain", "m/s"],
      ["E", "evaporation", "m/s"],
    ),
    validRange: "fresh water stirred through the whole layer",
    provenance: "common practice",
    remark: "",
  },
  {
    id: "buoyancy",
    group: "fresh water",
    title: "Surface buoyancy flux and Monin–Obukhov length",
    citation: "surface buoyancy balance (common practice); Monin & Obukhov (1954)",
    equation: "B = g[α Q/(ρ cp0) + β S (P - E)],  L = u*³/(κ B)",
    tex: [
      String.raw`B = g\left[\frac{\alpha\,Q}{\rho\,c_{p0}} + \beta S\,(P - E)\right], \qquad L = \frac{u_*^3}{\kappa B}`,
    ],
    symbols: symbols(
      ["B", "buoyancy flux, positive stabilises", "m²/s³"],
      ["L", "Monin–Obukhov length", "m"],
      ["u*", "friction velocity in water", "m/s"],
    ),
    validRange: "surface layer",
    provenance: "independent computation",
    remark: "",
  },
  {
    id: "wind-limit",
    group: "fresh water",
    title: "Wind that a fresh or warm lid survives",
    citation: "derived here; same reasoning as Thompson, Moum, Fairall & Rutledge (2019)",
    equation: "u* = (κ B h)^(1/3)",
    tex: [String.raw`u_* = (\kappa B h)^{1/3}`],
    symbols: symbols(["h", "depth of the lid", "m"], ["B", "buoyancy flux", "m²/s³"]),
    validRange: "indicator to ±25 %",
    provenance: "independent computation",
    remark: "",
  },
];
