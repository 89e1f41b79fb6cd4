import type { MethodSource } from "../method-source";
import { symbols } from "./symbols";

export const CYCLONE: readonly MethodSource[] = [
  {
    id: "cyclone-wind",
    group: "cyclone",
    title: "Parametric wind of a tropical cyclone",
    citation: "Holland (1980), Monthly Weather Review 108:1212-1218; Holland (2008); Holland, Belanger & Fritz (2010)",
    equation: "p = pc + Δp exp(-(Rm/r)^B)\nV = √((B/ρ)(Rm/r)^B Δp exp(-(Rm/r)^B) + (rf/2)²) - r|f|/2",
    tex: [
      String.raw`p = p_c + \Delta p\,e^{-(R_m/r)^B}`,
      String.raw`V = \sqrt{\frac{B}{\rho}\left(\frac{R_m}{r}\right)^B \Delta p\,e^{-(R_m/r)^B} + \left(\frac{rf}{2}\right)^2} - \frac{r\,|f|}{2}`,
    ],
    symbols: symbols(
      ["pc", "central pressure", "Pa"],
      ["Rm", "radius of maximum wind", "m"],
      ["B", "shape", "1"],
      ["r", "distance from the centre", "m"],
    ),
    validRange: "mature cyclones over open sea",
    provenance: "independent computation",
    remark: "Inflow angle and translation from memory.",
  },
  {
    id: "cyclone-2008",
    group: "cyclone",
    title: "Shape of a cyclone from its pressure",
    citation: "Holland (2008), Monthly Weather Review 136:3432-3445",
    equation:
      "b = -4.4e-5 Δp² + 0.01 Δp + 0.03 dpc/dt - 0.014 |φ| + 0.15 Vt^x + 1,  x = 0.6 (1 - Δp/215)\nV = √(b Δp/(ρ e))",
    tex: [
      String.raw`b = -4.4\times 10^{-5}\,\Delta p^2 + 0.01\,\Delta p + 0.03\,\frac{dp_c}{dt} - 0.014\,|\varphi| + 0.15\,V_t^{\,x} + 1, \qquad x = 0.6\left(1 - \frac{\Delta p}{215}\right)`,
      String.raw`V = \sqrt{\frac{b\,\Delta p}{\rho\,e}}`,
    ],
    symbols: symbols(
      ["b", "surface shape", "1"],
      ["Δp", "pressure deficit", "hPa"],
      ["φ", "latitude", "degrees"],
      ["Vt", "translation speed", "m/s"],
      ["V", "greatest surface wind", "m/s"],
    ),
    validRange: "mature cyclones; b held within 0.5…2.5",
    provenance: "independent computation",
    remark: "Read in two public codes.",
  },
  {
    id: "cyclone-2010",
    group: "cyclone",
    title: "Surface wind of a cyclone by distance",
    citation: "Holland, Belanger & Fritz (2010), Monthly Weather Review 138:4393-4401",
    equation: "V(r) = Vm ((Rm/r)^b exp(1 - (Rm/r)^b))^x",
    tex: [String.raw`V(r) = V_m\left[\left(\frac{R_m}{r}\right)^b e^{1 - (R_m/r)^b}\right]^x`],
    symbols: symbols(
      ["Vm", "greatest surface wind", "m/s"],
      ["Rm", "its radius", "m"],
      ["b", "surface shape", "1"],
      ["x", "0.5 inside Rm, fitted to an outer wind beyond", "1"],
    ),
    validRange: "mature cyclones over open sea",
    provenance: "published",
    remark: "Already at the surface: not reduced again. Read as an abstract.",
  },
  {
    id: "cyclone-surface",
    group: "cyclone",
    title: "From gradient wind to wind at 10 m",
    citation:
      "Knaff et al. (2011) and Franklin, Black & Valde (2003) for the reduction, as quoted by others; inflow and translation from memory",
    equation: "U10 = 0.90 V;  inflow 10° r/Rm inside Rm to 25° beyond 1.2 Rm;  plus Vt r Rm/(r² + Rm²)",
    tex: [String.raw`U_{10} = 0.90\,V, \qquad \Delta U = V_t\,\frac{r R_m}{r^2 + R_m^2}`],
    symbols: symbols(
      ["V", "gradient wind", "m/s"],
      ["Vt", "translation speed", "m/s"],
      ["r", "distance from the centre", "m"],
    ),
    validRange: "over sea, within some 100 km; 0.80 in the outer vortex",
    provenance: "from memory",
    remark: "Strongest to the right of the way in the north, to the left in the south.",
  },
  {
    id: "cyclone-rain",
    group: "cyclone",
    title: "Rain of a tropical cyclone",
    citation: "Tuleya, DeMaria & Kuligowski (2007), Weather and Forecasting 22:56-70",
    equation: "R = T0 + (Tm - T0) r/rm inside rm;  Tm exp(-(r - rm)/re) outside",
    tex: [
      String.raw`R = \begin{cases} T_0 + (T_m - T_0)\,\dfrac{r}{r_m} & r < r_m \\ T_m\,e^{-(r - r_m)/r_e} & r \ge r_m \end{cases}`,
    ],
    symbols: symbols(["R", "rain rate", "mm/h"], ["r", "distance from the centre", "km"]),
    validRange: "climatological mean; single eyewalls 2 to 4 times higher",
    provenance: "published",
    remark: "Table read as quoted in a public implementation.",
  },
];
