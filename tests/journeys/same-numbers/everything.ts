/** What the engine answers, as text that holds every bit. Bundled and run in Node and in the browser alike. */
import { CHECK_METHODS } from "../../../app/cli/check-methods";
import { CaseInputs } from "../../../app/cli/checks/case-inputs";
import checks from "../../published/engine-checks.json";
import { bitText } from "./bits";
import { AVOIDED_BY_THE_ENGINE, mathValues, USED_BY_THE_ENGINE } from "./math-functions";
import { SEEDED_SCENARIOS } from "./seeded-scenarios";
import { OceanError } from "~/ocean/errors";
import { estimate } from "~/ocean/estimate";
import { mulberry32 } from "~/ocean/statistics/mulberry32";

/** Runs of many steps, and those that ask for whole numbers, are made with their own inputs only. */
const AS_STATED = /^(column|endToEnd|stats)\./;
const VARIANTS = 12;
const ARGUMENTS = 50_000;

export interface Everything {
  /** A response, or a primitive formula's answers, by name. */
  answers: Record<string, string>;
  mathUsed: Record<string, string>;
  mathAvoided: Record<string, string>;
}

export function everything(): Everything {
  const answers: Record<string, string> = {};
  for (const { name, scenario } of SEEDED_SCENARIOS) answers[name] = bitText(estimate(scenario));
  for (const [k, { id, method, inputs }] of checks.entries()) answers[id] = sweep(method, inputs, k);
  return {
    answers,
    mathUsed: bitRows(mathValues(USED_BY_THE_ENGINE, ARGUMENTS)),
    mathAvoided: bitRows(mathValues(AVOIDED_BY_THE_ENGINE, ARGUMENTS)),
  };
}

/** A formula's answer to a case's own inputs, then to inputs moved by up to a tenth. */
function sweep(method: string, inputs: object, seed: number): string {
  const random = mulberry32(seed);
  const moved = (value: unknown): unknown => {
    if (typeof value === "number") return value * (0.9 + 0.2 * random());
    if (Array.isArray(value)) return value.map(moved);
    return value;
  };
  const answers = [answer(method, inputs)];
  for (let variant = 0; variant < VARIANTS && !AS_STATED.test(method); variant++) {
    answers.push(answer(method, Object.fromEntries(Object.entries(inputs).map(([key, value]) => [key, moved(value)]))));
  }
  return answers.join(" ");
}

function answer(method: string, inputs: object): string {
  try {
    return bitText(CHECK_METHODS[method](new CaseInputs({ ...inputs })));
  } catch (error) {
    if (error instanceof OceanError) return error.code;
    throw error;
  }
}

function bitRows(rows: Record<string, number[]>): Record<string, string> {
  return Object.fromEntries(Object.entries(rows).map(([name, values]) => [name, bitText(values)]));
}
