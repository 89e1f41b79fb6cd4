import { OceanError } from "../errors";
import { headlineOf } from "../headline/headline";
import { responseSeries } from "../headline/response-series";
import { runModel } from "../models/run-model";
import type { Band, Headline } from "../response";
import type { Scenario } from "../scenario";
import { latinHypercube } from "../statistics/latin-hypercube";
import { quantile } from "../statistics/quantile";
import { FACTORS } from "./factors";

/**
 * Runs the members of a Latin hypercube over the uncertain inputs and lays the 10th, 50th and 90th percentile of every
 * headline figure beside its value. The same seed gives the same bands.
 * @returns the headline with bands
 * @throws OceanError where no member could be computed
 * @see McKay, Beckman & Conover (1979); Hyndman & Fan (1996)
 */
export function withBands(scenario: Scenario, headline: Headline): Headline {
  if (!scenario.ensemble) return headline;
  const members = memberHeadlines(scenario, scenario.ensemble);
  const band = (figure: (member: Headline) => number | null): Band => {
    const values = members.map(figure).filter((value) => value !== null);
    return values.length === 0
      ? {}
      : { p10: quantile(values, 0.1), p50: quantile(values, 0.5), p90: quantile(values, 0.9) };
  };
  return {
    peakStress: { ...headline.peakStress, ...band((member) => member.peakStress.value) },
    peakDrift: { ...headline.peakDrift, ...band((member) => member.peakDrift.value) },
    netDisplacement: { ...headline.netDisplacement, ...band((member) => member.netDisplacement.value) },
    transportAlong: { ...headline.transportAlong, ...band((member) => member.transportAlong.value) },
    transportAcross: { ...headline.transportAcross, ...band((member) => member.transportAcross.value) },
    surfaceSalinity: { ...headline.surfaceSalinity, ...band((member) => member.surfaceSalinity.value) },
    surfaceTemperature: { ...headline.surfaceTemperature, ...band((member) => member.surfaceTemperature.value) },
    layerDepth: { ...headline.layerDepth, ...band((member) => member.layerDepth.value) },
    densityStep: { ...headline.densityStep, ...band((member) => member.densityStep.value) },
    triggers: headline.triggers.map((trigger, k) => ({
      ...trigger,
      ...band((member) => member.triggers[k].hoursBeyond),
    })),
  };
}

function memberHeadlines(scenario: Scenario, { members, seed }: { members: number; seed: number }): Headline[] {
  const factors = FACTORS.filter(({ applies }) => applies(scenario));
  const headlines: Headline[] = [];
  for (const row of latinHypercube(members, factors.length, seed)) {
    const member = factors.reduce((varied, factor, i) => factor.vary(varied, row[i]), scenario);
    const headline = computed(member);
    if (headline) headlines.push(headline);
  }
  if (headlines.length === 0) {
    throw new OceanError(
      "NOT_CONVERGED",
      "No member of the ensemble could be computed; the case lies at the edge of what the model can bear.",
    );
  }
  return headlines;
}

/** A member may fall over an edge (a thinner layer that evaporates away) that the scenario itself does not. */
function computed(member: Scenario): Headline | null {
  try {
    const run = runModel(member);
    return headlineOf(member, run, responseSeries(member, run));
  } catch (error) {
    if (error instanceof OceanError) return null;
    throw error;
  }
}
