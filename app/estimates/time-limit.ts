import type { Scenario, ScenarioProblem } from "~/ocean/scenario";

/** s; a single estimate takes a few. Common practice, no source; so are the next two. */
const EVERY_RUN = 300;
/** s a member: ten times what one takes on an idle machine. */
const COLUMN_MEMBER = 10;
const LAYER_MEMBER = 0.3;

/** How long a run may take before it is taken to have gone astray, in seconds: longer for more members. */
export function timeLimitSeconds({ method, ensemble }: Pick<Scenario, "method" | "ensemble">): number {
  const each = method?.model === "column" ? COLUMN_MEMBER : LAYER_MEMBER;
  return EVERY_RUN + (ensemble?.members ?? 0) * each;
}

/** What a run that was stopped at its limit ends with. */
export function tooLong(scenario: Pick<Scenario, "method" | "ensemble">): ScenarioProblem {
  const minutes = Math.round(timeLimitSeconds(scenario) / 60);
  const fewer = scenario.ensemble ? "Ask for fewer members, narrow" : "Narrow";
  return {
    path: "",
    code: "TOO_LONG",
    message: `The run took more than ${minutes} minutes and was stopped. ${fewer} the storm's window, or take larger cells or a longer time step.`,
  };
}
