import { FAIL, MISSING, NOT_EVALUATED, PASS, SUSPECT, type Flags } from "../flags";

export interface FlatLimits {
  /** Values in a row, the current one among them, that are suspect when they are alike; null: none are. */
  suspectCount: number | null;
  /** Values in a row that are bad. */
  failCount: number | null;
  /** Alike: from the lowest to the highest no more than this, in the channel's unit. */
  tolerance: number;
  /** The row has to last at least so long as well, h. */
  leastHours: number;
}

const HOUR = 3600;

/** Whether the row that ends at `k` is alike; `unknown` where a value of it is missing, `short` where the record is too young. */
function lastRow(
  time: ArrayLike<number>,
  values: ArrayLike<number>,
  k: number,
  count: number,
  limits: FlatLimits,
): "alike" | "varies" | "unknown" | "short" {
  let [low, high] = [values[k], values[k]];
  for (let back = 1; ; back++) {
    if (back >= count && time[k] - time[k - back + 1] >= limits.leastHours * HOUR) return "alike";
    const value = values[k - back];
    if (value === undefined) return "short";
    if (Number.isNaN(value)) return "unknown";
    low = Math.min(low, value);
    high = Math.max(high, value);
    if (high - low > limits.tolerance) return "varies";
  }
}

/**
 * Flat line: the current and the values before it are alike, as when a sensor sticks. The row counts the current value: three
 * alike are a row of three. Passes while the record is shorter than a row; not evaluated where a row has a missing value.
 * @param time seconds, ascending
 * @param values NaN where missing
 * @param exempt values of which it is natural to stay as they are: a calm, no rain, no light
 * @returns 1, 2, 3, 4 or 9 for each value
 * Source: QARTOD wind manual, test 8, by its prose (five most recent values), not its loop (six).
 */
export function flatLine(
  time: ArrayLike<number>,
  values: ArrayLike<number>,
  limits: FlatLimits,
  exempt: (k: number) => boolean = () => false,
): Flags {
  const { suspectCount, failCount } = limits;
  const row = (k: number, count: number | null) =>
    count === null ? "varies" : lastRow(time, values, k, count, limits);
  return Uint8Array.from(values, (value, k) => {
    if (Number.isNaN(value)) return MISSING;
    if (exempt(k)) return NOT_EVALUATED;
    if (row(k, failCount) === "alike") return FAIL;
    const short = row(k, suspectCount);
    return short === "alike" ? SUSPECT : short === "unknown" ? NOT_EVALUATED : PASS;
  });
}
