/** Names of the engine's laws and parameters, as a memo prints them. */
import { dragLawName } from "~/ocean/stress/drag-law-names";
import type { MethodChoices } from "~/ocean/scenario";

const PARAMETER_NAMES: Record<keyof Required<MethodChoices>, string> = {
  model: "Model",
  dragLaw: "Drag law",
  dragCoefficient: "Drag coefficient",
  highWindCap: "Wind speed above which the drag coefficient is held",
  airDensity: "Density of the air",
  waterDensity: "Reference density of sea water",
  heatCapacity: "Specific heat capacity of sea water",
  gravity: "Acceleration of gravity",
  timeStep: "Time step",
  dampingRate: "Damping rate of inertial motion",
  ekman: "Ekman solution",
  eddyViscosity: "Eddy viscosity",
  penetratingShortwave: "Short-wave radiation penetrates",
  waterType: "Jerlov water type",
  heatInterpolation: "Heat between samples",
  rainHeat: "Heat carried by rain",
  cellSize: "Cell size",
  maxDepth: "Depth of the column",
  bottomDrag: "Bottom drag coefficient",
  gradientMixing: "Mixing by the gradient Richardson number",
  bulkRichardson: "Critical bulk Richardson number",
  gradientRichardson: "Critical gradient Richardson number",
  layerDensityStep: "Density step that bounds the layer",
};

/** A parameter's name; one that this list lacks by its key. */
export function parameterName(key: string): string {
  return key in PARAMETER_NAMES ? PARAMETER_NAMES[key as keyof MethodChoices] : key;
}

/**
 * A parameter's value as text: as given, with a proper minus sign; powers of ten for the very small. Nobody states more
 * than 15 digits: a value that has them was computed, and six are told.
 */
export function parameterValue(value: number | string | boolean): string {
  if (typeof value === "boolean") return value ? "yes" : "no";
  if (typeof value === "string") return dragLawName(value);
  const stated = significantDigits(value) > 15 ? Number(value.toPrecision(6)) : value;
  const small = stated !== 0 && (Math.abs(stated) < 1e-3 || Math.abs(stated) >= 1e7);
  const [digits = "", power] = (small ? stated.toExponential() : String(stated)).split("e");
  const text = power === undefined ? digits : `${digits} × 10${superscript(Number(power))}`;
  return text.replace("-", "−");
}

/** A sentence of the engine's sources as it is printed: minus signs, and powers of ten for `7.29e-5`. */
export function printedNumbers(text: string): string {
  return text
    .replace(/(\d)e(-?\d+)/g, (_, digit: string, power: string) => `${digit} × 10${superscript(Number(power))}`)
    .replace(/(?<![\p{L}\d])-(?=\d)/gu, "−");
}

function significantDigits(value: number): number {
  return value.toExponential().replace(/e.*$/, "").replace(/\D/g, "").length;
}

const SUPERSCRIPTS = "⁰¹²³⁴⁵⁶⁷⁸⁹";

function superscript(power: number): string {
  const digits = [...String(Math.abs(power))].map((digit) => SUPERSCRIPTS[Number(digit)]).join("");
  return power < 0 ? `⁻${digits}` : digits;
}
