/** Where a path stands at whole multiples of an interval after its start. */
export interface ElapsedMark {
  /** h since the start */
  hours: number;
  x: number;
  y: number;
}

/**
 * Linear between samples; none where a neighbouring sample is missing.
 * @param time seconds, ascending
 * @param everyHours h, above zero; the start itself is the first mark
 */
export function elapsedMarks(
  time: ArrayLike<number>,
  x: ArrayLike<number>,
  y: ArrayLike<number>,
  everyHours: number,
): ElapsedMark[] {
  const marks: ElapsedMark[] = [];
  const start = time[0] ?? Number.NaN;
  const last = time.length - 1;
  let index = 0;
  for (let hours = 0; start + hours * 3600 <= (time[last] ?? Number.NaN); hours += everyHours) {
    const seconds = start + hours * 3600;
    while (index < last && (time[index + 1] ?? 0) <= seconds) index += 1;
    const next = Math.min(last, index + 1);
    const step = (time[next] ?? 0) - (time[index] ?? 0);
    const share = step > 0 ? (seconds - (time[index] ?? 0)) / step : 0;
    const at = (values: ArrayLike<number>) => {
      const before = values[index] ?? Number.NaN;
      return share === 0 ? before : before + share * ((values[next] ?? Number.NaN) - before);
    };
    const mark = { hours, x: at(x), y: at(y) };
    if (Number.isFinite(mark.x) && Number.isFinite(mark.y)) marks.push(mark);
  }
  return marks;
}
