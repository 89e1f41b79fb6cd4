const DAY = 86400;
const DAYS_NEEDED = 3;

/**
 * Whether amounts look like a day's total written again in every row of the day: with several rows a day, all rows of
 * nearly every day are equal, and several days have rain. Summing such rows counts each day's rain many times over.
 * @param utc seconds, one a row
 * @param order rows in time order, one a stamp
 */
export function repeatsDailyTotal(values: Float64Array, utc: Float64Array, order: readonly number[]): boolean {
  const days = new Map<number, { low: number; high: number; rows: number }>();
  // A row on midnight closes the day before it.
  for (const row of order) {
    const value = values[row] ?? NaN;
    if (Number.isNaN(value)) continue;
    const key = Math.ceil((utc[row] ?? 0) / DAY);
    const day = days.get(key);
    if (day === undefined) days.set(key, { low: value, high: value, rows: 1 });
    else days.set(key, { low: Math.min(day.low, value), high: Math.max(day.high, value), rows: day.rows + 1 });
  }
  const full = [...days.values()].filter(({ rows }) => rows >= 4);
  const wet = full.filter(({ high }) => high > 0);
  const constant = wet.filter(({ low, high }) => low === high);
  return constant.length >= DAYS_NEEDED && constant.length >= 0.7 * wet.length;
}
