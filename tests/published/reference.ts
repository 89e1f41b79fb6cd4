import { spawnSync } from "node:child_process";
import { fileURLToPath } from "node:url";
import { z } from "zod";

const PROGRAM = fileURLToPath(new URL("reference.py", import.meta.url));
const numbers = z.array(z.number().nullable());
const answerSchema = z.record(z.string(), z.union([numbers, z.array(numbers)]));

/** Python with a reference library; null, with a notice, where the machine has none. */
export function pythonWith(library: "gsw" | "geographiclib"): string | null {
  const python = ["/usr/bin/python3", "python3"].find(
    (command) => spawnSync(command, ["-c", `import ${library}`]).status === 0,
  );
  if (!python) process.stdout.write(`Skipped: python3-${library} is not installed; nothing is compared with it.\n`);
  return python ?? null;
}

/** A reference library's answer to one request; see `reference.py`. */
export function askReference(python: string, request: { ask: string } & Record<string, unknown>) {
  const { stdout, stderr, status } = spawnSync(python, [PROGRAM], {
    input: JSON.stringify(request),
    encoding: "utf8",
    maxBuffer: 256 * 1024 * 1024,
  });
  if (status !== 0) throw new Error(`The reference program failed: ${stderr}`);
  const answer = answerSchema.parse(JSON.parse(stdout));
  const find = (name: string) => answer[name] ?? missing(name);
  return {
    list: (name: string): (number | null)[] => numbers.parse(find(name)),
    table: (name: string): (number | null)[][] => z.array(numbers).parse(find(name)),
  };
}

function missing(name: string): never {
  throw new Error(`The reference program gave no "${name}".`);
}

type Numbers = readonly (number | null)[];

/** The largest |a - b|/(|b| + floor) over all pairs; a missing number on one side alone counts as infinite. */
export function worst(ours: Numbers, theirs: Numbers, floor = 0): number {
  return largest(ours, theirs, (a, b) => Math.abs(a - b) / (Math.abs(b) + floor));
}

/** The largest |a - b| over all pairs; a missing number on one side alone counts as infinite. */
export function greatest(ours: Numbers, theirs: Numbers): number {
  return largest(ours, theirs, (a, b) => Math.abs(a - b));
}

function largest(ours: Numbers, theirs: Numbers, size: (a: number, b: number) => number): number {
  if (ours.length !== theirs.length || ours.length === 0) return Number.POSITIVE_INFINITY;
  return ours.reduce<number>((most, value, k) => {
    const other = theirs[k];
    if (value === null || other === null) return value === other ? most : Number.POSITIVE_INFINITY;
    const off = size(value, other);
    return Number.isNaN(off) ? Number.POSITIVE_INFINITY : Math.max(most, off);
  }, 0);
}
