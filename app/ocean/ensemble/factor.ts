import type { ResolvedMethod } from "../method/resolve-method";
import type { Scenario } from "../scenario";

/** One uncertain input: where a number in 0…1 leads it, and how the scenario changes. */
export interface Factor {
  name: string;
  /** Range in words, with its unit. */
  range: string;
  /** Where the range comes from. */
  basis: string;
  /** Whether the scenario has what the factor varies; `method` is the one in use, defaults filled in. */
  applies: (scenario: Scenario, method: ResolvedMethod) => boolean;
  vary: (scenario: Scenario, u: number, method: ResolvedMethod) => Scenario;
  /** What the input is at u, as `+10 %`. */
  setting: (u: number, method: ResolvedMethod) => string;
  /** How many equal shares of 0…1 stand for one choice each; absent where the factor is continuous. */
  choices?: (method: ResolvedMethod) => number;
}

/** The values of u at which a factor is tried by itself: its two ends, or each of its choices. */
export function trialsOf({ choices }: Factor, method: ResolvedMethod): number[] {
  const count = choices?.(method);
  return count === undefined ? [0, 1] : Array.from({ length: count }, (_, k) => (k + 0.5) / count);
}
