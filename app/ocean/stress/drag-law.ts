import { COARE_CAP } from "../constants";
import { OceanError, type RangeWarning } from "../errors";
import { requireNotNegative, requirePositive } from "../guards";
import { DRAG_LAWS, type DragLawId } from "../scenario";
import { coare35Neutral } from "./laws/coare35";
import { garratt1977 } from "./laws/garratt-1977";
import { largePond1981 } from "./laws/large-pond-1981";
import { largeYeager2009 } from "./laws/large-yeager-2009";
import { smith1980 } from "./laws/smith-1980";
import { trenberth1990 } from "./laws/trenberth-1990";
import { wu1982 } from "./laws/wu-1982";
import { wu1982floor } from "./laws/wu-1982-floor";
import { zijlema2012 } from "./laws/zijlema-2012";

/** Drag coefficient from the wind at 10 m (m/s). */
export type DragLaw = (wind10: number) => number;

/** Coefficient of law `constant` where none is given. Price (1981) found it to fall short by some 40 % under a hurricane. */
export const CONSTANT_DRAG = 1.5e-3;

const LAWS: Record<Exclude<DragLawId, "constant" | "coare35">, DragLaw> = {
  largePond1981,
  trenberth1990,
  smith1980,
  garratt1977,
  wu1982,
  wu1982floor,
  zijlema2012,
  largeYeager2009,
};

/** Wind speeds that each law is stated for, m/s. */
export const LAW_RANGES: Record<DragLawId, readonly [number, number]> = {
  constant: [0, 25],
  largePond1981: [4, 25],
  trenberth1990: [0, 25],
  smith1980: [6, 22],
  garratt1977: [4, 21],
  wu1982: [1, 50],
  wu1982floor: [1, 50],
  zijlema2012: [0, 50],
  largeYeager2009: [0.5, 60],
  coare35: [0, 25],
};

export interface DragOptions {
  /** For law `constant`. */
  coefficient?: number;
  /** m/s: the coefficient is held at its value here above this speed; none when absent. */
  highWindCap?: number;
  /** Kinematic viscosity of air, m²/s (coare35). */
  viscosity?: number;
  /** m/s² (coare35). */
  gravity?: number;
}

/**
 * The drag law of a name, ready for loops (its argument is not checked).
 * @throws OceanError INVALID_INPUT for an unknown law or a coefficient or cap that is not positive
 */
export function dragLaw(id: DragLawId, options: DragOptions = {}): DragLaw {
  const law = uncapped(id, options);
  if (options.highWindCap === undefined) return law;
  requirePositive({ highWindCap: options.highWindCap });
  const cap = options.highWindCap;
  return (wind10) => law(Math.min(wind10, cap));
}

function uncapped(id: DragLawId, options: DragOptions): DragLaw {
  if (id === "constant") {
    const coefficient = options.coefficient ?? CONSTANT_DRAG;
    requirePositive({ coefficient });
    return () => coefficient;
  }
  if (id === "coare35") {
    // The implicit relation has no solution in a dead calm or far beyond any storm: held at the ends.
    return (wind10) => coare35Neutral(Math.min(60, Math.max(0.1, wind10)), options.viscosity, options.gravity).cd;
  }
  const law = Object.hasOwn(LAWS, id) ? LAWS[id] : undefined;
  if (!law)
    throw new OceanError("INVALID_INPUT", `Unknown drag law "${String(id)}"; known are ${DRAG_LAWS.join(", ")}.`);
  return law;
}

/**
 * Drag coefficient at one wind speed, checked.
 * @param id law @param wind10 wind at 10 m, m/s, ≥ 0
 * @throws OceanError INVALID_INPUT
 */
export function dragCoefficient(id: DragLawId, wind10: number, options: DragOptions = {}): number {
  requireNotNegative({ wind10 });
  return dragLaw(id, options)(wind10);
}

/** The cap that belongs to a law when none was chosen, m/s: its fit ends at 25 for COARE, else hurricane force. */
export function defaultCap(id: DragLawId, hurricaneForce: number): number {
  return id === "coare35" ? COARE_CAP : hurricaneForce;
}

/** A warning where the wind lies outside the range that the law is stated for. */
export function dragRangeWarning(id: DragLawId, wind10: number): RangeWarning | null {
  const [low, high] = LAW_RANGES[id];
  if (wind10 >= low && wind10 <= high) return null;
  const message = `Wind of ${wind10} m/s lies outside the ${low}…${high} m/s that drag law ${id} is stated for.`;
  return { code: "OUT_OF_RANGE", message, value: wind10, threshold: wind10 < low ? low : high };
}
