import { convert, convertBack } from "./conversions";
import { displayUnit, type QuantityId } from "./quantities";
import type { UnitChoices } from "./unit-choices";

export interface FormattedQuantity {
  /** With a proper minus sign; empty where there is no value. */
  number: string;
  unit: string;
  /** Number and unit joined by a no-break space, or `no value`. */
  text: string;
}

export interface FormatOptions {
  /** Show a plus sign on positive numbers, as for changes. */
  sign?: boolean;
  /** In place of the quantity's own decimals. */
  decimals?: number;
}

export const MINUS = "\u2212";
/** No-break space: the narrow one is missing from Roboto Condensed and would print as a box. */
export const SPACE = "\u00a0";

/** A value in SI turned to the unit it is shown in. */
export function toDisplay(value: number, id: QuantityId, choices: UnitChoices): number {
  return convert(value, displayUnit(id, choices).ratio);
}

/** A value as shown, turned back to SI. */
export function fromDisplay(value: number, id: QuantityId, choices: UnitChoices): number {
  return convertBack(value, displayUnit(id, choices).ratio);
}

/** A number of fixed decimals with a proper minus sign; groups of three from 10 000 up; never a negative zero. */
export function formatNumber(value: number, decimals: number, sign = false): string {
  const fixed = Math.abs(value).toFixed(decimals);
  const zero = Number(fixed) === 0;
  const [whole = "0", fraction] = fixed.split(".");
  const grouped = whole.length > 4 && !whole.includes("e") ? whole.replace(/\B(?=(\d{3})+$)/g, SPACE) : whole;
  const before = zero ? "" : value < 0 ? MINUS : sign ? "+" : "";
  return before + grouped + (fraction === undefined ? "" : `.${fraction}`);
}

/** Joins a number and its unit: `12 m`, but `128°`. */
export function joinUnit(number: string, unit: string): string {
  return unit === "°" ? `${number}°` : `${number}${SPACE}${unit}`;
}

/**
 * A value in SI as it is read on screen and in print.
 * @param value in the quantity's SI unit; null, undefined or not finite gives `no value`
 */
export function formatQuantity(
  value: number | null | undefined,
  id: QuantityId,
  choices: UnitChoices,
  options: FormatOptions = {},
): FormattedQuantity {
  if (value === null || value === undefined || !Number.isFinite(value)) {
    return { number: "", unit: "", text: "no value" };
  }
  if (id === "direction") {
    const number = formatBearingNumber(value);
    return { number, unit: "°", text: `${number}°` };
  }
  const { unit, decimals } = displayUnit(id, choices);
  const number = formatNumber(toDisplay(value, id, choices), options.decimals ?? decimals, options.sign);
  return { number, unit, text: joinUnit(number, unit) };
}

/** `31.6 to 32.2 g/kg`: two values that share a unit; `no value` where one is missing. */
export function formatRange(
  low: number | null | undefined,
  high: number | null | undefined,
  id: QuantityId,
  choices: UnitChoices,
  options: FormatOptions = {},
): string {
  const from = formatQuantity(low, id, choices, options);
  const to = formatQuantity(high, id, choices, options);
  if (from.number === "" || to.number === "") return "no value";
  return id === "direction" ? `${from.text} to ${to.text}` : `${from.number} to ${to.text}`;
}

/** A bearing in degrees true, as `128°`; `no direction` for still water or calm. */
export function formatBearing(degrees: number | null | undefined): string {
  if (degrees === null || degrees === undefined || !Number.isFinite(degrees)) return "no direction";
  return `${formatBearingNumber(degrees)}°`;
}

function formatBearingNumber(degrees: number): string {
  const whole = Math.round(((degrees % 360) + 360) % 360) % 360;
  return String(whole).padStart(3, "0");
}
