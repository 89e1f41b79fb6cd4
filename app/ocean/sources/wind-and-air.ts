import type { MethodSource } from "../method-source";
import { symbols } from "./symbols";

export const WIND_AND_AIR: readonly MethodSource[] = [
  {
    id: "wind-height",
    group: "wind and air",
    title: "Wind at 10 m",
    citation: "neutral logarithmic profile (common practice), as in Large & Pond (1981)",
    equation: "U10 = Uz/(1 + (√Cd(U10)/κ) ln(z/10))",
    tex: [String.raw`U_{10} = \frac{U_z}{1 + \dfrac{\sqrt{C_d(U_{10})}}{\kappa}\,\ln\dfrac{z}{10}}`],
    symbols: symbols(
      ["Uz", "wind at height z", "m/s"],
      ["z", "height above the sea", "m"],
      ["κ", "von Kármán's constant, 0.40", "1"],
    ),
    validRange: "near-neutral air, 1…50 m",
    provenance: "independent computation",
    remark: "",
  },
  {
    id: "wind-power-law",
    group: "wind and air",
    title: "Wind at 10 m by the one-seventh power law",
    citation: "Coastal Engineering Manual (USACE), eq. II-2-9",
    equation: "U10 = Uz (10/z)^(1/7)",
    tex: [String.raw`U_{10} = U_z\left(\frac{10}{z}\right)^{1/7}`],
    symbols: symbols(["Uz", "wind at height z", "m/s"], ["z", "height above the sea", "m"]),
    validRange: "8…12 m, near-neutral air",
    provenance: "published",
    remark: "A cross-check; records are brought to 10 m by the logarithmic law.",
  },
  {
    id: "wind-averaging",
    group: "wind and air",
    title: "Averaging period of the wind",
    citation: "Coastal Engineering Manual, US Army Corps of Engineers, part II-2",
    equation: "Ut/U3600 = 1.277 + 0.296 tanh(0.9 log10(45/t)), t ≤ 3600 s;  -0.15 log10 t + 1.5334 above",
    tex: [
      String.raw`\frac{U_t}{U_{3600}} = \begin{cases} 1.277 + 0.296\tanh\left(0.9\log_{10}\dfrac{45}{t}\right) & t \le 3600\ \mathrm{s} \\ 1.5334 - 0.15\log_{10} t & t > 3600\ \mathrm{s} \end{cases}`,
    ],
    symbols: symbols(["Ut", "strongest mean over t seconds", "m/s"], ["t", "averaging period", "s"]),
    validRange: "1 s…10 h",
    provenance: "published",
    remark: "The constants of the first branch are from memory; they give the manual's own value at five minutes.",
  },
  {
    id: "air",
    group: "wind and air",
    title: "Humidity and density of air",
    citation: "Buck (1981), Journal of Applied Meteorology 20:1527-1532, as in the COARE algorithm",
    equation:
      "es = 6.1121 exp(17.502 t/(240.97 + t)) (1.0007 + 3.46e-6 p)\nρa = 100 p/(287.1 (t + 273.16)(1 + 0.61 q))",
    tex: [
      String.raw`e_s = 6.1121\,\exp\left(\frac{17.502\,t}{240.97 + t}\right)(1.0007 + 3.46\times 10^{-6}\,p)`,
      String.raw`\rho_a = \frac{100\,p}{287.1\,(t + 273.16)(1 + 0.61\,q)}`,
    ],
    symbols: symbols(
      ["es", "saturation vapour pressure", "hPa"],
      ["t", "air temperature", "°C"],
      ["p", "air pressure", "hPa"],
      ["q", "specific humidity", "kg/kg"],
    ),
    validRange: "-40…50 °C, 850…1060 hPa",
    provenance: "reference library",
    remark: "",
  },
  {
    id: "wind-components",
    group: "wind and air",
    title: "Wind components from the direction it comes from",
    citation: "meteorological convention (common practice)",
    equation: "u = -U sin ϑ,  v = -U cos ϑ",
    tex: [String.raw`u = -U\sin\vartheta, \qquad v = -U\cos\vartheta`],
    symbols: symbols(
      ["u", "wind towards the east", "m/s"],
      ["v", "wind towards the north", "m/s"],
      ["ϑ", "direction from, clockwise from north", "degrees"],
    ),
    validRange: "everywhere",
    provenance: "common practice",
    remark: "Between samples the components are interpolated, never the direction.",
  },
];
