/** One JSON line a figure; a figure whose right value is known also says what it should be and by how much it is off. */
export function report(name: string, value: number, unit: string, n: number, expected?: number): void {
  const beside =
    expected === undefined ? {} : { expected, relativeError: Math.abs(value - expected) / Math.abs(expected) };
  console.log(JSON.stringify({ name, value, unit, n, ...beside }));
}

interface Timed<Result> {
  result: Result;
  nanoseconds: number;
}

export function timed<Result>(work: () => Result): Timed<Result> {
  const start = process.hrtime.bigint();
  const result = work();
  return { result, nanoseconds: Number(process.hrtime.bigint() - start) };
}

/** Least time of several runs: the machine's other work only ever adds. */
export function fastest<Result>(runs: number, work: () => Result): Timed<Result> {
  let best = timed(work);
  for (let run = 1; run < runs; run++) {
    const next = timed(work);
    if (next.nanoseconds < best.nanoseconds) best = next;
  }
  return best;
}

/** Least times of two ways of the same work, by turns, so that both meet the same machine. */
export function sideBySide<Result>(
  rounds: number,
  work: () => Result,
  otherNanoseconds: (() => number) | null,
): Timed<Result> & { otherNanoseconds: number | null } {
  let best = timed(work);
  let other = otherNanoseconds && otherNanoseconds();
  for (let round = 1; round < rounds; round++) {
    const next = timed(work);
    if (next.nanoseconds < best.nanoseconds) best = next;
    if (otherNanoseconds && other !== null) other = Math.min(other, otherNanoseconds());
  }
  return { ...best, otherNanoseconds: other };
}
