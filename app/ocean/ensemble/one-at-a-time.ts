import { OceanError } from "../errors";
import type { ResolvedMethod } from "../method/resolve-method";
import type { Headline } from "../response";
import type { Scenario } from "../scenario";
import type { Factor } from "./factor";
import { runMember } from "./members";

/** A factor by itself at one of its settings; null where that could not be computed. */
export interface Trial {
  setting: string;
  headline: Headline | null;
}

/** Runs the scenario with one factor at the two ends of its range, or at each of its choices, all else as given. */
export function oneAtATime(factor: Factor, scenario: Scenario, method: ResolvedMethod): Trial[] {
  return trialsOf(factor, method).map((u) => {
    const run = runMember(factor.vary(scenario, u, method));
    return { setting: factor.setting(u, method), headline: run instanceof OceanError ? null : run.headline };
  });
}

function trialsOf({ choices }: Factor, method: ResolvedMethod): number[] {
  const count = choices?.(method);
  return count === undefined ? [0, 1] : Array.from({ length: count }, (_, k) => (k + 0.5) / count);
}
