import { z } from "zod";
import { OceanError } from "~/ocean/errors";
import { CHECK_METHODS, type CheckAnswer } from "../check-methods";
import { CaseInputs } from "./case-inputs";

export const checkCaseSchema = z.object({
  id: z.string(),
  method: z.string(),
  inputs: z.record(z.string(), z.unknown()),
  expected: z.unknown().refine((value) => value !== undefined, "is missing"),
  tolerance: z.object({ abs: z.number().optional(), rel: z.number().optional() }).optional(),
  source: z.string().optional(),
  sourceKind: z.string().optional(),
});
export type CheckCase = z.infer<typeof checkCaseSchema>;

export type CheckResult = { outcome: "passed" | "skipped" } | { outcome: "failed"; expected: string; got: string };

type Tolerance = { abs?: number; rel?: number };

/** Runs one case through the engine and compares every expected figure. */
export function runCase({ method, inputs, expected, tolerance = {} }: CheckCase): CheckResult {
  if (!Object.hasOwn(CHECK_METHODS, method)) return { outcome: "skipped" };
  const answer = answered(() => CHECK_METHODS[method](new CaseInputs(inputs)));
  const wanted = asObject(expected);
  const fits =
    wanted !== null && "error" in wanted
      ? "error" in answer && answer.error === wanted.error
      : !("error" in answer) &&
        agrees(
          expected,
          wanted === null || Array.isArray(expected) ? soleFigure(answer.figures) : answer.figures,
          tolerance,
        );
  if (fits) return { outcome: "passed" };
  return {
    outcome: "failed",
    expected: written(expected),
    got: written("error" in answer ? answer : named(answer.figures, wanted)),
  };
}

function answered(work: () => CheckAnswer): { figures: CheckAnswer } | { error: string; message: string } {
  try {
    return { figures: work() };
  } catch (error) {
    if (error instanceof OceanError) return { error: error.code, message: error.message };
    // A fault of the engine is one failed case, not the end of the file.
    return { error: "UNEXPECTED", message: error instanceof Error ? error.message : String(error) };
  }
}

function asObject(value: unknown): Record<string, unknown> | null {
  return typeof value === "object" && value !== null && !Array.isArray(value)
    ? (value as Record<string, unknown>)
    : null;
}

/** Where a case expects a bare number or list, the method's first figure is meant. */
function soleFigure(figures: CheckAnswer): unknown {
  return Object.values(figures)[0];
}

/** Only what was asked for, so that a failure's line stays short. */
function named(figures: CheckAnswer, wanted: Record<string, unknown> | null): unknown {
  if (wanted === null) return soleFigure(figures);
  if ("error" in wanted) return figures;
  return Object.fromEntries(Object.keys(wanted).map((key) => [key, figures[key]]));
}

function agrees(expected: unknown, got: unknown, tolerance: Tolerance): boolean {
  if (typeof expected === "number") {
    return (
      typeof got === "number" &&
      Math.abs(got - expected) <= (tolerance.abs ?? 0) + (tolerance.rel ?? 0) * Math.abs(expected)
    );
  }
  if (expected === "Infinity") return got === Number.POSITIVE_INFINITY;
  if (expected === "-Infinity") return got === Number.NEGATIVE_INFINITY;
  if (Array.isArray(expected)) {
    return (
      Array.isArray(got) &&
      got.length === expected.length &&
      expected.every((item, k) => agrees(item, got[k], tolerance))
    );
  }
  const wanted = asObject(expected);
  if (wanted === null) return expected === got;
  const figures = asObject(got);
  return figures !== null && Object.keys(wanted).every((key) => agrees(wanted[key], figures[key], tolerance));
}

/** JSON that can also say infinity, no number and absent. */
function written(value: unknown): string {
  return JSON.stringify(value, (_, item) => {
    if (typeof item === "number" && !Number.isFinite(item)) return String(item);
    return item === undefined ? "absent" : item;
  });
}
