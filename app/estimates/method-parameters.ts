/** Laws and parameters of a method sheet as a person reads and chooses them. */
import { DRAG_LAW_NAMES } from "~/ocean/stress/drag-law-names";
import type { MethodUsed } from "~/ocean/response";
import type { MethodChoices } from "~/ocean/scenario";

export type MethodKey = keyof MethodChoices;

interface ChoiceParameter {
  kind: "choice";
  options: Record<string, string>;
}
interface NumberParameter {
  kind: "number";
  /** Empty where dimensionless. */
  unit: string;
}

export type Parameter = (ChoiceParameter | NumberParameter) & {
  label: string;
  /** What it does, and what holds where it is left open. */
  hint: string;
};

const YES_NO = { true: "yes", false: "no" };

export const MODEL_LABELS: Record<NonNullable<MethodChoices["model"]>, string> = {
  budget: "Budget: steady Ekman drift of a fixed layer",
  slab: "Slab: inertial motion of a fixed layer",
  column: "Column: layer that mixes and deepens",
  coastal: "Coastal: balance at a straight shore",
};

export const PARAMETERS: Record<MethodKey, Parameter> = {
  model: { kind: "choice", options: MODEL_LABELS, label: "Model", hint: "Default: slab." },
  dragLaw: {
    kind: "choice",
    options: DRAG_LAW_NAMES,
    label: "Drag law",
    hint: "Default: Large and Yeager (2009), bounded at high winds.",
  },
  dragCoefficient: {
    kind: "number",
    unit: "",
    label: "Drag coefficient",
    hint: "For the constant law only. Default: 0.0015 (order of magnitude in textbook use: common practice, no source).",
  },
  highWindCap: {
    kind: "number",
    unit: "m/s",
    label: "High-wind cap",
    hint: "The drag coefficient is held above this 10 m wind. Default: 33 m/s (Powell et al. 2003); 25 m/s for COARE 3.5.",
  },
  airDensity: { kind: "number", unit: "kg/m³", label: "Air density", hint: "Default: 1.22 kg/m³ (convention)." },
  waterDensity: {
    kind: "number",
    unit: "kg/m³",
    label: "Reference water density",
    hint: "Boussinesq. Default: 1025 kg/m³ (convention).",
  },
  heatCapacity: {
    kind: "number",
    unit: "J/kg/K",
    label: "Heat capacity of seawater",
    hint: "Default: 3991.868 J/kg/K (TEOS-10).",
  },
  gravity: { kind: "number", unit: "m/s²", label: "Gravity", hint: "Default: 9.81 m/s² (convention)." },
  timeStep: {
    kind: "number",
    unit: "s",
    label: "Longest time step",
    hint: "Default: 600 s; 450 s for the column (convention).",
  },
  dampingRate: {
    kind: "number",
    unit: "1/s",
    label: "Damping of inertial motion",
    hint: "Default: 2.89e-6 1/s, an e-folding time of four days (Pollard and Millard 1970); none in the column.",
  },
  ekman: {
    kind: "choice",
    options: { deep: "deep water", finiteDepth: "finite depth, no slip at the bed" },
    label: "Ekman balance",
    hint: "For model budget. Default: deep water; finite depth needs the water depth of the box.",
  },
  eddyViscosity: {
    kind: "number",
    unit: "m²/s",
    label: "Eddy viscosity",
    hint: "For finite depth and the coast. Default: from the mean wind by Ekman's empirical depth.",
  },
  penetratingShortwave: {
    kind: "choice",
    options: YES_NO,
    label: "Shortwave reaches below the layer",
    hint: "Needs a shortwave series. Default: no; yes in the column.",
  },
  waterType: {
    kind: "choice",
    options: { I: "I, clearest", IA: "IA", IB: "IB", II: "II", III: "III, most turbid" },
    label: "Optical water type (Jerlov)",
    hint: "Default: IB (Paulson and Simpson 1977).",
  },
  heatInterpolation: {
    kind: "choice",
    options: { linear: "linear between times", hold: "holds until the next time" },
    label: "Heat between its times",
    hint: "Default: linear (convention). Mean fluxes over intervals hold.",
  },
  rainHeat: {
    kind: "choice",
    options: YES_NO,
    label: "Heat carried by rain",
    hint: "Default: no.",
  },
  cellSize: {
    kind: "number",
    unit: "m",
    label: "Cell of the column",
    hint: "Default: 1 m; 0.5 m in water shallower than 60 m or below a layer thinner than 15 m (convention).",
  },
  maxDepth: {
    kind: "number",
    unit: "m",
    label: "Depth of the column",
    hint: "Default: four layer depths, at least 200 m, or the water depth (convention).",
  },
  bottomDrag: {
    kind: "number",
    unit: "",
    label: "Bottom drag coefficient",
    hint: "Column only. Default: 0.0025 (common practice, from memory).",
  },
  gradientMixing: {
    kind: "choice",
    options: YES_NO,
    label: "Gradient mixing",
    hint: "Column only. Default: yes (Price, Weller and Pinkel 1986).",
  },
  bulkRichardson: {
    kind: "number",
    unit: "",
    label: "Critical bulk Richardson number",
    hint: "Column only. Default: 0.65 (Price, Weller and Pinkel 1986, from memory).",
  },
  gradientRichardson: {
    kind: "number",
    unit: "",
    label: "Critical gradient Richardson number",
    hint: "Column only. Default: 0.25 (Price, Weller and Pinkel 1986, from memory).",
  },
  layerDensityStep: {
    kind: "number",
    unit: "kg/m³",
    label: "Density step that ends the layer",
    hint: "For casts and the column. Default: 0.03 kg/m³ (de Boyer Montégut et al. 2004, from memory).",
  },
};

const COLUMN_ONLY: readonly MethodKey[] = [
  "cellSize",
  "maxDepth",
  "bottomDrag",
  "gradientMixing",
  "bulkRichardson",
  "gradientRichardson",
  "layerDensityStep",
];

/** Whether a response's model and laws ask for a parameter, or leave it aside. */
export function isInUse(key: MethodKey, method: MethodUsed): boolean {
  const model = method.model?.value;
  const finiteDepth = method.ekman?.value === "finiteDepth";
  switch (key) {
    case "dragCoefficient":
      return method.dragLaw?.value === "constant";
    case "ekman":
      return model === "budget";
    case "eddyViscosity":
      return model === "coastal" || (model === "budget" && finiteDepth);
    case "dampingRate":
      return model === "slab" || model === "column";
    case "waterType":
      return method.penetratingShortwave?.value === true;
    default:
      return model === "column" || !COLUMN_ONLY.includes(key);
  }
}

export const METHOD_KEYS = Object.keys(PARAMETERS) as MethodKey[];

/** A value as it is read: an option's words, or a number with its unit. */
export function parameterText(key: MethodKey, value: number | string | boolean, unit: string): string {
  const parameter = PARAMETERS[key];
  if (parameter.kind === "choice") return parameter.options[String(value)] ?? String(value);
  const number = typeof value === "number" ? tidyNumber(value) : String(value);
  return unit === "" || unit === "1" ? number : `${number}\u00a0${unit}`;
}

/** Seven figures at most, three below one; powers of ten where the number is very small or large. */
export function tidyNumber(value: number): string {
  if (value === 0) return "0";
  const size = Math.abs(value);
  if (size >= 1e-3 && size < 1e6) return String(Number(value.toPrecision(size < 1 ? 3 : 7))).replace("-", "\u2212");
  return scientific(value, 3);
}

const SUPERSCRIPTS: Record<string, string> = Object.fromEntries(
  [..."0123456789-"].map((digit, index) => [digit, [..."⁰¹²³⁴⁵⁶⁷⁸⁹⁻"][index] ?? ""]),
);

/** `1.40 × 10⁻⁶` */
export function scientific(value: number, figures: number): string {
  if (value === 0) return "0";
  const [mantissa = "", exponent = ""] = value.toExponential(figures - 1).split("e");
  const power = [...String(Number(exponent))].map((digit) => SUPERSCRIPTS[digit] ?? digit).join("");
  return `${mantissa.replace("-", "\u2212")} × 10${power}`;
}
