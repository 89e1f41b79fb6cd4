import type { z } from "zod";
import type { Scenario, ScenarioProblem } from "./scenario";
import { modelRules } from "./validation/model-rules";
import { boxRules, waterRules } from "./validation/place-and-water-rules";
import {
  boxSchema,
  castSchema,
  ensembleSchema,
  methodSchema,
  stormSchema,
  triggersSchema,
  twoLayerSchema,
} from "./validation/scenario-schema";
import { stormRules } from "./validation/storm-rules";

const PARTS = ["box", "water", "storm", "method", "triggerLevels", "ensemble"];

/** As many as a person can work through; the last one then says that there are more. */
const MOST_PROBLEMS = 50;

/**
 * Everything that is wrong with a scenario, whatever was handed in; empty when it can be computed. Never throws.
 * Codes are those of `OceanErrorCode`; paths read like `storm.windSpeed[3]`.
 */
export function validateScenario(scenario: unknown): ScenarioProblem[] {
  if (typeof scenario !== "object" || scenario === null || Array.isArray(scenario)) {
    return [
      { path: "", code: "INVALID_INPUT", message: "A scenario must be a JSON object with box, water and storm." },
    ];
  }
  const parts = scenario as Record<string, unknown>;
  const hasCast = typeof parts.water === "object" && parts.water !== null && "cast" in parts.water;
  const shape = [
    ...Object.keys(parts).flatMap((key) => (PARTS.includes(key) ? [] : [unknownKey("", key)])),
    ...shapeProblems(boxSchema, parts.box, "box"),
    ...shapeProblems(hasCast ? castSchema : twoLayerSchema, parts.water, "water"),
    ...shapeProblems(stormSchema, parts.storm, "storm"),
    ...shapeProblems(methodSchema.optional(), parts.method, "method"),
    ...shapeProblems(triggersSchema.optional(), parts.triggerLevels, "triggerLevels"),
    ...shapeProblems(ensembleSchema.optional(), parts.ensemble, "ensemble"),
  ];
  if (shape.length > 0) return shortened(shape);

  const sound = scenario as Scenario;
  const rules = [...boxRules(sound.box), ...waterRules(sound.water), ...stormRules(sound.storm)];
  return shortened(rules.length > 0 ? rules : modelRules(sound));
}

function shapeProblems(schema: z.ZodType, part: unknown, name: string): ScenarioProblem[] {
  if (part === undefined && !schema.safeParse(undefined).success) {
    return [{ path: name, code: "INVALID_INPUT", message: `The scenario needs "${name}".` }];
  }
  const parsed = schema.safeParse(part, { error: plainMessage });
  if (parsed.success) return [];
  return parsed.error.issues.flatMap((issue) => {
    const path = pathText(name, issue.path);
    if (issue.code === "unrecognized_keys") return issue.keys.map((key) => unknownKey(path, key));
    const code =
      issue.code === "custom" && typeof issue.params?.code === "string" ? issue.params.code : "INVALID_INPUT";
    return [{ path, code, message: issue.message }];
  });
}

function unknownKey(parent: string, key: string): ScenarioProblem {
  const path = parent === "" ? key : `${parent}.${key}`;
  return { path, code: "INVALID_INPUT", message: "A scenario knows no such key; check its spelling." };
}

const KINDS: Record<string, string> = { object: "an object", array: "a list", string: "text" };

/** For the parts that say nothing more particular themselves. */
function plainMessage(issue: z.core.$ZodRawIssue): string | undefined {
  return issue.code === "invalid_type" ? `Must be ${KINDS[issue.expected] ?? issue.expected}.` : undefined;
}

function pathText(root: string, path: readonly PropertyKey[]): string {
  return path.reduce<string>(
    (text, step) => (typeof step === "number" ? `${text}[${step}]` : `${text}.${String(step)}`),
    root,
  );
}

function shortened(problems: ScenarioProblem[]): ScenarioProblem[] {
  if (problems.length <= MOST_PROBLEMS) return problems;
  const more = problems.length - MOST_PROBLEMS;
  const last = { path: "", code: "INVALID_INPUT", message: `${more} more problems of this kind; mend these first.` };
  return [...problems.slice(0, MOST_PROBLEMS), last];
}
