import type { MethodSource } from "../method-source";
import { symbols } from "./symbols";

export const SLAB: readonly MethodSource[] = [
  {
    id: "slab",
    group: "slab",
    title: "Slab with inertial motion",
    citation: "Pollard & Millard (1970), Deep-Sea Research 17:813-821",
    equation: "dZ/dt + (i f + r) Z = τ/(ρ H),  dX/dt = Z",
    tex: [String.raw`\frac{dZ}{dt} + (if + r)\,Z = \frac{\tau}{\rho H}, \qquad \frac{dX}{dt} = Z`],
    symbols: symbols(
      ["Z", "layer velocity u + iv", "m/s"],
      ["X", "displacement", "m"],
      ["r", "damping rate", "1/s"],
      ["H", "layer depth", "m"],
    ),
    validRange: "well-mixed layer of steady depth, away from the shore",
    provenance: "independent computation",
    remark:
      "Solved exactly for a stress that runs linearly through each step. Damping over four days as supported by a later study's abstract.",
  },
  {
    id: "wind-energy",
    group: "slab",
    title: "Power that the wind gives the layer",
    citation: "mechanical work (common practice)",
    equation: "Π = τ · u",
    tex: [String.raw`\Pi = \boldsymbol\tau\cdot\mathbf u`],
    symbols: symbols(["Π", "power", "W/m²"], ["τ", "wind stress", "N/m²"], ["u", "layer velocity", "m/s"]),
    validRange: "everywhere",
    provenance: "common practice",
    remark: "Negative where the wind brakes the layer.",
  },
];
