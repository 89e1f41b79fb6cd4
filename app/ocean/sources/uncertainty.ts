import type { MethodSource } from "../method-source";
import { symbols } from "./symbols";

export const UNCERTAINTY: readonly MethodSource[] = [
  {
    id: "ensemble",
    group: "uncertainty",
    title: "Latin hypercube ensemble",
    citation: "McKay, Beckman & Conover (1979), Technometrics 21:239-245; quantiles of type 7, Hyndman & Fan (1996)",
    equation: "p10, p50, p90 over members that vary every uncertain input that the scenario has",
    tex: [
      String.raw`x_{ij} = \frac{\pi_j(i) + u_{ij}}{n}, \qquad p_{10},\ p_{50},\ p_{90}\ \text{of}\ y(x_1), \ldots, y(x_n)`,
    ],
    symbols: [],
    validRange: "at least 200 members for layer models, 64 for the column",
    provenance: "published",
    remark:
      "What is varied and how far stands in the table of uncertain inputs; where no source is named a range is a convention of this engine.",
  },
  {
    id: "quantile",
    group: "uncertainty",
    title: "Percentiles",
    citation: "Hyndman & Fan (1996), The American Statistician 50:361-365, type 7",
    equation: "h = (n - 1) p, linear between ranks",
    tex: [
      String.raw`Q(p) = x_{\lfloor h\rfloor} + (h - \lfloor h\rfloor)\,(x_{\lfloor h\rfloor + 1} - x_{\lfloor h\rfloor}), \qquad h = (n - 1)\,p`,
    ],
    symbols: symbols(["p", "share, 0…1", "1"], ["n", "members", "1"]),
    validRange: "any number of members",
    provenance: "published",
    remark: "",
  },
  {
    id: "one-at-a-time",
    group: "uncertainty",
    title: "One factor at a time",
    citation: "one-at-a-time sensitivity (common practice)",
    equation: "y(factor at each end of its range), all else as given",
    tex: [String.raw`\Delta y_j = y(x_1, \ldots, x_j^{\pm}, \ldots, x_d) - y(x)`],
    symbols: symbols(["y", "headline figure", ""], ["x", "uncertain inputs", ""]),
    validRange: "says nothing of inputs that act together",
    provenance: "common practice",
    remark: "",
  },
  {
    id: "correlation-ratio",
    group: "uncertainty",
    title: "Share of the spread that one factor explains",
    citation:
      "Pearson (1905) and Kelley (1935); from a given sample as by Plischke, Borgonovo & Smith (2013), European Journal of Operational Research 226:536-550 (from memory)",
    equation: "S = 1 - (n - 1)/(n - m) (1 - Σ_k n_k (y_k - y)²/Σ(y_i - y)²)",
    tex: [
      String.raw`S = 1 - \frac{n - 1}{n - m}\left(1 - \frac{\sum_k n_k\,(\bar y_k - \bar y)^2}{\sum_i (y_i - \bar y)^2}\right)`,
    ],
    symbols: symbols(
      ["S", "first-order index", "1"],
      ["n", "members", "1"],
      ["m", "groups of equal shares of the factor", "1"],
    ),
    validRange: "64 members and more",
    provenance: "from memory",
    remark:
      "Checked here against functions whose indices are known. Chance alone passes 2√(2(m - 1))/(n - 1) about once in 25 times.",
  },
  {
    id: "variance-based",
    group: "uncertainty",
    title: "Indices from runs made for them",
    citation:
      "Saltelli et al. (2010), Computer Physics Communications 181:259-270; Jansen (1999), Computer Physics Communications 117:35-43",
    equation: "S_i = mean(f_B (f_ABi - f_A))/V,  ST_i = mean((f_A - f_ABi)²)/(2V)",
    tex: [
      String.raw`S_i = \frac{\overline{f_B\,(f_{AB_i} - f_A)}}{V}, \qquad S_{T_i} = \frac{\overline{(f_A - f_{AB_i})^2}}{2V}`,
    ],
    symbols: symbols(["S", "first-order index", "1"], ["ST", "total index", "1"], ["V", "variance", ""]),
    validRange: "thousands of runs",
    provenance: "independent computation",
    remark: "",
  },
  {
    id: "elementary-effects",
    group: "uncertainty",
    title: "Elementary effects",
    citation: "Morris (1991), Technometrics 33:161-174",
    equation: "d = (y(x + δ e_j) - y(x))/δ,  δ = p/(2(p - 1))",
    tex: [String.raw`d_j = \frac{y(x + \delta\,e_j) - y(x)}{\delta}, \qquad \delta = \frac{p}{2\,(p - 1)}`],
    symbols: symbols(["d", "elementary effect", ""], ["p", "levels of the grid", "1"]),
    validRange: "screening of many factors",
    provenance: "published",
    remark: "",
  },
];
