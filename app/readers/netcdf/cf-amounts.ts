/** How amounts were added up: over each step, from 00 UTC of each day, or from the start on. */
export type Accumulation = "step" | "day" | "start";

const DAY = 86_400;
/** Rounding of packed values shows as small falls; what falls by less of the largest value is none. */
const ROUNDING = 1e-4;

/**
 * What each stamp adds, from amounts that go on growing: the difference to the stamp before, but the amount itself
 * where the sum was begun anew. The first stamp has none where it is not known when the sum began.
 * Source for the daily form: ECMWF, ERA5-Land documentation: accumulated from 00 UTC, so that 00 UTC holds the whole
 * day before.
 * @param amounts one a stamp; may be negative, as fluxes out of the sea are
 * @param utc seconds, ascending
 */
export function amountsOfSteps(amounts: Float64Array, utc: Float64Array, accumulation: Accumulation): Float64Array {
  if (accumulation === "step") return amounts;
  const rounding = roundingOf(amounts);
  const neverNegative = amounts.every((value) => !(value < -rounding));
  return amounts.map((amount, index) => {
    const before = amounts[index - 1] ?? NaN;
    const day = dayOfSum(utc[index] ?? NaN);
    if (accumulation === "day") {
      const first =
        index === 0 ? (utc[index] ?? NaN) - day * DAY === stepOf(utc) : day !== dayOfSum(utc[index - 1] ?? NaN);
      return first ? amount : tidy(amount - before, neverNegative, rounding);
    }
    const anew = neverNegative && amount < before - rounding;
    return index === 0 ? NaN : anew ? amount : tidy(amount - before, neverNegative, rounding);
  });
}

/** A fall within the rounding is no rain that was taken back. */
function tidy(increment: number, neverNegative: boolean, rounding: number): number {
  return neverNegative && increment < 0 && increment > -rounding ? 0 : increment;
}

/** The day whose sum a stamp belongs to: 00 UTC closes the day before. */
function dayOfSum(seconds: number): number {
  return Math.ceil(seconds / DAY) - 1;
}

function stepOf(utc: Float64Array): number {
  return (utc[1] ?? NaN) - (utc[0] ?? NaN);
}

function roundingOf(amounts: Float64Array): number {
  let largest = 0;
  for (const amount of amounts) if (Math.abs(amount) > largest) largest = Math.abs(amount);
  return largest * ROUNDING;
}

/**
 * How amounts that are never negative look to have been added up, by where they fall.
 * @returns null where they do not tell: too few, or all nothing
 */
export function looksAccumulated(amounts: Float64Array, utc: Float64Array): Accumulation | null {
  const rounding = roundingOf(amounts);
  let within = 0;
  let fallsWithin = 0;
  let rises = 0;
  let turns = 0;
  let fallsAtTurns = 0;
  for (let index = 1; index < amounts.length; index += 1) {
    const [amount, before] = [amounts[index] ?? NaN, amounts[index - 1] ?? NaN];
    if (Number.isNaN(amount + before) || amount < -rounding) continue;
    if (dayOfSum(utc[index] ?? NaN) === dayOfSum(utc[index - 1] ?? NaN)) {
      within += 1;
      if (amount < before - rounding) fallsWithin += 1;
      if (amount > before + rounding) rises += 1;
    } else if (before > rounding) {
      turns += 1;
      if (amount < before - rounding) fallsAtTurns += 1;
    }
  }
  if (within < 6 || rises < 3) return null;
  if (fallsWithin > 0) return "step";
  return turns > 0 && fallsAtTurns === turns ? "day" : "start";
}

/** Interval that each stamp's value stands for, by the bounds of its time. */
export interface Bounds {
  /** Seconds, one a stamp. */
  start: Float64Array;
  end: Float64Array;
}

/**
 * Rates per second of amounts over the intervals that the file states; intervals that share their start are differenced.
 * @returns NaN where an interval has no length
 */
export function ratesByBounds(amounts: Float64Array, { start, end }: Bounds): Float64Array {
  return amounts.map((amount, index) => {
    const goesOn = start[index] === start[index - 1] && (end[index] ?? NaN) > (end[index - 1] ?? NaN);
    const [from, already] = goesOn ? [end[index - 1] ?? NaN, amounts[index - 1] ?? NaN] : [start[index] ?? NaN, 0];
    const seconds = (end[index] ?? NaN) - from;
    return seconds > 0 ? (amount - already) / seconds : NaN;
  });
}
