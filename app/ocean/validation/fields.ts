import { z } from "zod";
import type { OceanErrorCode } from "../errors";

/** What a value was, short enough for a message. */
function told(value: unknown): string {
  if (value === undefined) return "it is missing";
  if (typeof value === "string") return `it is the text "${value.slice(0, 40)}"`;
  if (typeof value === "object") return value === null ? "it is null" : "it is not a number";
  return `it is ${String(value)}`;
}

/** A finite number within limits; the message names the limits, the unit and what stood there. */
export function numberWithin(low: number, high: number, unit: string) {
  const message = (input: unknown) => `Must be a number from ${low} to ${high}${unit && ` ${unit}`}; ${told(input)}.`;
  return z.number({ error: (issue) => message(issue.input) }).refine((value) => value >= low && value <= high, {
    error: (issue) => message(issue.input),
  });
}

/** A depth in m: code NONPOSITIVE_DEPTH where it is not greater than zero. */
export function depthWithin(low: number, high: number) {
  const message = (input: unknown) => `Must be a depth from ${low} to ${high} m; ${told(input)}.`;
  return z
    .number({ error: (issue) => message(issue.input) })
    .refine((value) => value > 0, {
      error: (issue) => message(issue.input),
      params: { code: "NONPOSITIVE_DEPTH" satisfies OceanErrorCode },
    })
    .refine((value) => value <= 0 || (value >= low && value <= high), { error: (issue) => message(issue.input) });
}

export function seriesOf(element: z.ZodType<number>) {
  return z.array(element, { error: (issue) => `Must be a list of numbers; ${told(issue.input)}.` });
}

export function oneOf<const Values extends readonly [string, ...string[]]>(values: Values) {
  return z.enum(values, { error: (issue) => `Must be one of ${values.join(", ")}; ${told(issue.input)}.` });
}

export function yesOrNo() {
  return z.boolean({ error: (issue) => `Must be true or false; ${told(issue.input)}.` });
}
