import { OceanError } from "../errors";
import type { ModelRun } from "../models/run-model";
import type { Headline, MemberFailure, Response, Uncertainty } from "../response";
import type { Scenario } from "../scenario";
import { latinHypercube } from "../statistics/latin-hypercube";
import { seriesBands, withBands } from "./bands";
import { effectsOf, type Drawn } from "./effects";
import { FACTORS } from "./factors";
import { memberFigures } from "./member-figures";
import { MemberSeries, runMember } from "./members";
import { oneAtATime } from "./one-at-a-time";

/**
 * Runs the members of a Latin hypercube over the uncertain inputs: the 10th, 50th and 90th percentile of every headline
 * figure and series, what each figure depends on, and what was varied. The same seed gives the same answer.
 * @param run the scenario's own run @param headline its figures
 * @returns the headline with its bands, and the rest; the headline as it is where the scenario asks for no ensemble
 * @throws OceanError where no member could be computed
 * @see McKay, Beckman & Conover (1979); Hyndman & Fan (1996)
 */
export function runEnsemble(
  scenario: Scenario,
  { method }: Pick<ModelRun, "method">,
  headline: Headline,
): Pick<Response, "headline" | "bands" | "uncertainty" | "memberFigures"> {
  if (!scenario.ensemble) return { headline };
  const { members, seed } = scenario.ensemble;
  const factors = FACTORS.filter(({ applies }) => applies(scenario, method));
  const series = new MemberSeries(members, scenario.storm.time.length);
  const drawn: Drawn = { rows: [], headlines: [] };
  const refusals: OceanError[] = [];
  for (const row of latinHypercube(members, factors.length, seed)) {
    const member = runMember(factors.reduce((varied, factor, k) => factor.vary(varied, row[k], method), scenario));
    if (member instanceof OceanError) {
      refusals.push(member);
      continue;
    }
    series.add(member.series);
    drawn.rows.push(row);
    drawn.headlines.push(member.headline);
  }
  if (drawn.rows.length === 0) {
    throw new OceanError(
      "NOT_CONVERGED",
      `None of the ${members} members could be computed, though the scenario itself can; the first ended with: ${refusals[0].message}`,
      "ensemble",
    );
  }
  const trials = factors.map((factor) => oneAtATime(factor, scenario, method));
  return {
    headline: withBands(headline, drawn.headlines),
    bands: seriesBands(scenario.storm.time, series),
    memberFigures: memberFigures(drawn.headlines),
    uncertainty: {
      members,
      computed: drawn.rows.length,
      ...(refusals.length > 0 && { failures: failuresOf(refusals) }),
      seed,
      factors: factors.map(({ name, range, basis }, k): Uncertainty["factors"][number] => {
        const failed = trials[k].flatMap(({ setting, headline: figures }) => (figures ? [] : [setting]));
        return { name, range, basis, ...(failed.length > 0 && { failed }) };
      }),
      effects: effectsOf(headline, factors, method, trials, drawn),
    },
  };
}

/** Refusals by their code. */
function failuresOf(refusals: readonly OceanError[]): MemberFailure[] {
  const failures = new Map<string, MemberFailure>();
  for (const { code, message } of refusals) {
    const known = failures.get(code);
    if (known) known.members += 1;
    else failures.set(code, { code, message, members: 1 });
  }
  return [...failures.values()];
}
