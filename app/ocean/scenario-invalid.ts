import type { ScenarioProblem } from "./scenario";

/** The scenario cannot be computed; every problem says where, what and what to do. */
export class ScenarioInvalid extends Error {
  readonly problems: ScenarioProblem[];

  constructor(problems: ScenarioProblem[]) {
    super(problems.map(({ path, message }) => (path ? `${path}: ${message}` : message)).join("\n"));
    this.name = "ScenarioInvalid";
    this.problems = problems;
  }
}
