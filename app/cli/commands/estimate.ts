import { readFile } from "node:fs/promises";
import { estimate } from "~/ocean/estimate";
import type { Scenario, ScenarioProblem } from "~/ocean/scenario";
import { ScenarioInvalid } from "~/ocean/scenario-invalid";

/**
 * Computes the response of a scenario file and prints it as JSON, or `{ "errors": [...] }`.
 * @returns exit code: 1 where the scenario is invalid or cannot be read
 */
export async function estimateCommand(files: string[]): Promise<number> {
  if (files.length !== 1) {
    process.stderr.write("estimate needs one scenario file.\n");
    return 2;
  }
  const [file] = files;
  try {
    const scenario: Scenario = JSON.parse(await readFile(file, "utf8"));
    process.stdout.write(`${JSON.stringify(estimate(scenario), null, 2)}\n`);
    return 0;
  } catch (error) {
    process.stdout.write(`${JSON.stringify({ errors: problemsOf(error, file) }, null, 2)}\n`);
    return 1;
  }
}

function problemsOf(error: unknown, file: string): ScenarioProblem[] {
  if (error instanceof ScenarioInvalid) return error.problems;
  const unreadable = error instanceof SyntaxError || (error instanceof Error && "syscall" in error);
  if (!unreadable) throw error;
  const message = `${file} cannot be read as JSON: ${(error as Error).message}`;
  return [{ path: "", code: "INVALID_INPUT", message }];
}
