/** Why the engine refuses. Codes are fixed: they leave the house in check files and in the API's answers. */
export const OCEAN_ERROR_CODES = ["INVALID_INPUT", "NONPOSITIVE_DEPTH", "EQUATORIAL", "GAP", "NOT_CONVERGED"] as const;
export type OceanErrorCode = (typeof OCEAN_ERROR_CODES)[number];

/** A refusal with a code and a sentence that says what to do. */
export class OceanError extends Error {
  readonly code: OceanErrorCode;
  /** The part of a scenario that is to blame, as `water.layerDepth`; empty where a formula knows of none. */
  readonly path: string;

  constructor(code: OceanErrorCode, message: string, path = "") {
    super(message);
    this.name = "OceanError";
    this.code = code;
    this.path = path;
  }
}

/** Does some work, and blames a part of the scenario for what it refuses. */
export function blaming<Result>(path: string, work: () => Result): Result {
  try {
    return work();
  } catch (error) {
    if (!(error instanceof OceanError)) throw error;
    throw new OceanError(error.code, error.message, path);
  }
}

/** A value that is returned although it lies outside the range its source gives. */
export interface RangeWarning {
  code: "OUT_OF_RANGE" | "EQUATORIAL_MARGINAL";
  message: string;
  value: number;
  threshold: number;
}
