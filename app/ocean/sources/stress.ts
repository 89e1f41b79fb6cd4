import type { MethodSource, Provenance } from "../method-source";
import { dragLawName } from "../stress/drag-law-names";
import { symbols } from "./symbols";

const DRAG_SYMBOLS = symbols(["Cd", "drag coefficient at 10 m, neutral air", "1"], ["U", "wind speed at 10 m", "m/s"]);

function drag(
  id: string,
  citation: string,
  equation: string,
  tex: readonly string[],
  validRange: string,
  provenance: Provenance,
  remark = "",
): MethodSource {
  return {
    id: `drag-${id}`,
    group: "stress",
    title: `Drag coefficient, ${dragLawName(id)}`,
    citation,
    equation,
    tex,
    symbols: DRAG_SYMBOLS,
    validRange,
    provenance,
    remark,
  };
}

export const STRESS: readonly MethodSource[] = [
  {
    id: "stress",
    group: "stress",
    title: "Wind stress",
    citation: "bulk formula (common practice)",
    equation: "τ = ρa Cd |U| U",
    tex: [String.raw`\boldsymbol\tau = \rho_a\,C_d\,|\mathbf U|\,\mathbf U`],
    symbols: symbols(
      ["τ", "wind stress", "N/m²"],
      ["ρa", "density of air", "kg/m³"],
      ["Cd", "drag coefficient", "1"],
      ["U", "wind at 10 m", "m/s"],
    ),
    validRange: "that of the drag law",
    provenance: "common practice",
    remark: "Absolute wind: the surface current is not taken away.",
  },
  drag(
    "constant",
    "constant coefficient (common practice, no source)",
    "10³ Cd = 1.5 unless given",
    [String.raw`10^3\,C_d = 1.5`],
    "order of magnitude only",
    "common practice",
    "Price (1981) found 1.5e-3 to fall short by some 40 % under a hurricane; above 2.5e-3 is high.",
  ),
  drag(
    "largePond1981",
    "Large & Pond (1981), Journal of Physical Oceanography 11:324-336",
    "10³ Cd = 1.2 (U < 11);  0.49 + 0.065 U (11 ≤ U ≤ 25);  2.115 above",
    [
      String.raw`10^3\,C_d = \begin{cases} 1.2 & U < 11 \\ 0.49 + 0.065\,U & 11 \le U \le 25 \\ 2.115 & U > 25 \end{cases}`,
    ],
    "4…25 m/s, fetch at least 8 km",
    "published",
    "Read in a summary of the paper.",
  ),
  drag(
    "trenberth1990",
    "Trenberth, Large & Olson (1990), Journal of Physical Oceanography 20:1742-1760",
    "10³ Cd = 2.18 (U ≤ 1);  0.62 + 1.56/U (1 < U < 3);  1.14 (3 ≤ U < 10);  0.49 + 0.065 U above",
    [
      String.raw`10^3\,C_d = \begin{cases} 2.18 & U \le 1 \\ 0.62 + 1.56/U & 1 < U < 3 \\ 1.14 & 3 \le U < 10 \\ 0.49 + 0.065\,U & U \ge 10 \end{cases}`,
    ],
    "0…25 m/s",
    "published",
    "Read on the page of an upwelling-index product that uses it.",
  ),
  drag(
    "smith1980",
    "Smith (1980), Journal of Physical Oceanography 10:709-726",
    "10³ Cd = 0.61 + 0.063 U",
    [String.raw`10^3\,C_d = 0.61 + 0.063\,U`],
    "6…22 m/s",
    "published",
    "Read in a handbook.",
  ),
  drag(
    "garratt1977",
    "Garratt (1977), Monthly Weather Review 105:915-929",
    "10³ Cd = 0.75 + 0.067 U",
    [String.raw`10^3\,C_d = 0.75 + 0.067\,U`],
    "4…21 m/s",
    "from memory",
    "Price (1981) found a drag like this one right for a hurricane.",
  ),
  drag(
    "wu1982",
    "Wu (1982), Journal of Geophysical Research 87:9704-9706",
    "10³ Cd = 0.8 + 0.065 U",
    [String.raw`10^3\,C_d = 0.8 + 0.065\,U`],
    "breeze to hurricane",
    "published",
    "Read in a wave model's manual.",
  ),
  drag(
    "wu1982floor",
    "Wu (1982), Journal of Geophysical Research 87:9704-9706, with a floor in light wind",
    "10³ Cd = 1.2875 (U < 7.5);  0.8 + 0.065 U above",
    [String.raw`10^3\,C_d = \begin{cases} 1.2875 & U < 7.5 \\ 0.8 + 0.065\,U & U \ge 7.5 \end{cases}`],
    "breeze to hurricane",
    "published",
    "Read in a wave model's manual.",
  ),
  drag(
    "zijlema2012",
    "Zijlema, van Vledder & Holthuijsen (2012), Coastal Engineering 65:19-26",
    "10³ Cd = 0.55 + 2.97 x - 1.49 x²,  x = U/31.5",
    [String.raw`10^3\,C_d = 0.55 + 2.97\,x - 1.49\,x^2, \qquad x = \frac{U}{31.5}`],
    "0…50 m/s",
    "published",
    "Read in a wave model's manual. Falls again above 31.4 m/s.",
  ),
  drag(
    "largeYeager2009",
    "Large & Yeager (2009), Climate Dynamics 33:341-364",
    "10³ Cd = 2.7/U + 0.142 + 0.0764 U - 3.14807e-10 U⁶ (U ≤ 33);  2.34 above",
    [
      String.raw`10^3\,C_d = \begin{cases} \dfrac{2.7}{U} + 0.142 + 0.0764\,U - 3.14807\times 10^{-10}\,U^6 & U \le 33 \\ 2.34 & U > 33 \end{cases}`,
    ],
    "0.5…60 m/s",
    "published",
    "Read in five independent codes.",
  ),
  drag(
    "coare35",
    "Edson et al. (2013), Journal of Physical Oceanography 43:1589-1610, with corrigendum (2014)",
    "u* = κ U/ln(10/z0),  z0 = 0.11 ν/u* + a u*²/g,  a = 0.0017 min(U, 19) - 0.005,  Cd = (u*/U)²",
    [
      String.raw`u_* = \frac{\kappa\,U}{\ln(10/z_0)}, \qquad z_0 = \frac{0.11\,\nu}{u_*} + \frac{a\,u_*^2}{g}`,
      String.raw`a = 0.0017\min(U, 19) - 0.005, \qquad C_d = \left(\frac{u_*}{U}\right)^2`,
    ],
    "0…25 m/s",
    "published",
    "Held at 25 m/s unless another cap is chosen.",
  ),
  {
    id: "high-wind-cap",
    group: "stress",
    title: "Drag in high wind",
    citation:
      "Powell, Vickery & Reinhold (2003), Nature 422:279-283; Sanford et al. (2007), Geophysical Research Letters",
    equation: "Cd(U) = Cd(min(U, U_cap))",
    tex: [String.raw`C_d(U) = C_d(\min(U, U_{\mathrm{cap}}))`],
    symbols: symbols(["U_cap", "wind speed above which the coefficient is held", "m/s"]),
    validRange: "above hurricane force; uncertain by a factor of about 2 above 30 m/s",
    provenance: "published",
    remark: "Both read as abstracts.",
  },
];
