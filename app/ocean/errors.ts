/** Why the engine refuses. Codes are fixed: they leave the house in check files and in the API's answers. */
export const OCEAN_ERROR_CODES = ["INVALID_INPUT", "NONPOSITIVE_DEPTH", "EQUATORIAL", "GAP", "NOT_CONVERGED"] as const;
export type OceanErrorCode = (typeof OCEAN_ERROR_CODES)[number];

/** A refusal with a code and a sentence that says what to do. */
export class OceanError extends Error {
  readonly code: OceanErrorCode;

  constructor(code: OceanErrorCode, message: string) {
    super(message);
    this.name = "OceanError";
    this.code = code;
  }
}

/** A value that is returned although it lies outside the range its source gives. */
export interface RangeWarning {
  code: "OUT_OF_RANGE" | "EQUATORIAL_MARGINAL";
  message: string;
  value: number;
  threshold: number;
}
