import { OceanError } from "../errors";
import type { ModelRun } from "../models/run-model";
import { HEADLINE_FIGURES, BAND_NAMES, type Band, type Headline, type SeriesBands, type Response } from "../response";
import type { Scenario } from "../scenario";
import { latinHypercube } from "../statistics/latin-hypercube";
import { quantile } from "../statistics/quantile";
import { effectsOf, type Drawn } from "./effects";
import { FACTORS } from "./factors";
import { MemberSeries, runMember } from "./members";

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
): Pick<Response, "headline" | "bands" | "uncertainty"> {
  if (!scenario.ensemble) return { headline };
  const { members, seed } = scenario.ensemble;
  const factors = FACTORS.filter(({ applies }) => applies(scenario, method));
  const series = new MemberSeries(members, scenario.storm.time.length);
  const drawn: Drawn = { rows: [], headlines: [] };
  for (const row of latinHypercube(members, factors.length, seed)) {
    const member = runMember(factors.reduce((varied, factor, k) => factor.vary(varied, row[k], method), scenario));
    if (!member) continue;
    series.add(member.series);
    drawn.rows.push(row);
    drawn.headlines.push(member.headline);
  }
  if (drawn.rows.length === 0) {
    throw new OceanError(
      "NOT_CONVERGED",
      "No member of the ensemble could be computed; the case lies at the edge of what the model can bear.",
    );
  }
  return {
    headline: withBands(headline, drawn.headlines),
    bands: bandsOf(scenario, series),
    uncertainty: {
      members,
      computed: drawn.rows.length,
      seed,
      factors: factors.map(({ name, range, basis }) => ({ name, range, basis })),
      effects: effectsOf(scenario, method, headline, factors, drawn),
    },
  };
}

function withBands(headline: Headline, members: readonly Headline[]): Headline {
  const banded = { ...headline };
  for (const figure of HEADLINE_FIGURES) {
    Object.assign(banded, {
      [figure]: { ...headline[figure], ...bandOf(members.map((member) => member[figure].value)) },
    });
  }
  for (const figure of ["surfaceSalinity", "surfaceTemperature"] as const) {
    banded[figure].changeBand = bandOf(members.map((member) => member[figure].change));
  }
  banded.triggers = headline.triggers.map((trigger, k) => ({
    ...trigger,
    ...bandOf(members.map((member) => member.triggers[k].hoursBeyond)),
  }));
  return banded;
}

function bandOf(values: readonly (number | null)[]): Band {
  const known = values.filter((value) => value !== null);
  return known.length === 0 ? {} : percentiles(Float64Array.from(known));
}

function percentiles(values: Float64Array): Required<Band> {
  return { p10: quantile(values, 0.1), p50: quantile(values, 0.5), p90: quantile(values, 0.9) };
}

function bandsOf(scenario: Scenario, members: MemberSeries): SeriesBands {
  const bands = BAND_NAMES.map((name) => {
    const at = members.samples.map((_, sample) => percentiles(members.at(name, sample)));
    const series = { p10: at.map(({ p10 }) => p10), p50: at.map(({ p50 }) => p50), p90: at.map(({ p90 }) => p90) };
    return [name, series] as const;
  });
  return {
    time: members.samples.map((k) => scenario.storm.time[k]),
    series: Object.fromEntries(bands) as SeriesBands["series"],
  };
}
