import type { Response } from "~/ocean/response";
import type { ScenarioProblem } from "~/ocean/scenario";

/** What comes back from a worker thread: classes, and so errors of a type, do not cross. */
export type EstimateOutcome = { response: Response } | { problems: ScenarioProblem[] };
