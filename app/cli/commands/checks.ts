import { readFile } from "node:fs/promises";
import { z } from "zod";
import { checkCaseSchema, runCase, type CheckCase } from "../checks/run-case";

/**
 * Runs every case of the check files: a line for each failure, then the count.
 * @returns exit code: 1 if any case failed or was skipped, 2 where a file cannot be read
 */
export async function checks(files: string[]): Promise<number> {
  if (files.length === 0) {
    process.stderr.write("checks needs at least one check file.\n");
    return 2;
  }
  const counts = { passed: 0, failed: 0, skipped: 0 };
  const skippedMethods = new Set<string>();
  for (const file of files) {
    const cases = await readCases(file);
    if (cases === null) return 2;
    for (const one of cases) {
      const result = runCase(one);
      counts[result.outcome]++;
      if (result.outcome === "failed")
        process.stdout.write(`${one.id}: expected ${result.expected}, got ${result.got}\n`);
      if (result.outcome === "skipped") skippedMethods.add(one.method);
    }
  }
  if (skippedMethods.size > 0) process.stderr.write(`Methods the engine lacks: ${[...skippedMethods].join(", ")}\n`);
  process.stdout.write(`${counts.passed} passed, ${counts.failed} failed, ${counts.skipped} skipped\n`);
  return counts.failed + counts.skipped > 0 ? 1 : 0;
}

async function readCases(file: string): Promise<CheckCase[] | null> {
  try {
    return z.array(checkCaseSchema).parse(JSON.parse(await readFile(file, "utf8")));
  } catch (error) {
    const reason =
      error instanceof z.ZodError
        ? `item ${error.issues[0].path.join(".")}: ${error.issues[0].message}`
        : error instanceof Error
          ? error.message
          : String(error);
    process.stderr.write(`${file} is not a check file: ${reason}\n`);
    return null;
  }
}
