import type { ResolvedMethod } from "../method/resolve-method";
import type { Scenario } from "../scenario";

/** One uncertain input: where a number in 0…1 leads it, and how the scenario changes. */
export interface Factor {
  name: string;
  /** Range in words, with its unit. */
  range: string;
  /** Where the range comes from. */
  basis: string;
  /** When it is varied, in words, as `applies` decides. */
  when: string;
  /** Whether the scenario has what the factor varies; `method` is the one in use, defaults filled in. */
  applies: (scenario: Scenario, method: ResolvedMethod) => boolean;
  vary: (scenario: Scenario, u: number, method: ResolvedMethod) => Scenario;
  /** What the input is at u, as `+10 %`. */
  setting: (u: number, method: ResolvedMethod) => string;
  /** How many equal shares of 0…1 stand for one choice each; absent where the factor is continuous. */
  choices?: (method: ResolvedMethod) => number;
}
