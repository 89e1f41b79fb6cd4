import { BAND_NAMES, HEADLINE_FIGURES, type Band, type Headline, type SeriesBands } from "../response";
import { quantiles } from "../statistics/quantile";
import type { MemberSeries } from "./members";

/** The 10th, 50th and 90th percentile of the members' figures beside the scenario's own; directions have none. */
export function withBands(headline: Headline, members: readonly Headline[]): Headline {
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
    metInMembers: members.filter((member) => member.triggers[k].met).length,
  }));
  return banded;
}

/** The percentiles of every series. @param time of all the storm's samples */
export function seriesBands(time: readonly (string | number)[], members: MemberSeries): SeriesBands {
  const bands = BAND_NAMES.map((name) => {
    const at = members.samples.map((_, sample) => percentiles(members.at(name, sample)));
    const series = { p10: at.map(({ p10 }) => p10), p50: at.map(({ p50 }) => p50), p90: at.map(({ p90 }) => p90) };
    return [name, series] as const;
  });
  return {
    time: members.samples.map((k) => time[k]),
    series: Object.fromEntries(bands) as SeriesBands["series"],
  };
}

function bandOf(values: readonly (number | null)[]): Band {
  const known = values.filter((value) => value !== null);
  return known.length === 0 ? {} : percentiles(known);
}

function percentiles(values: ArrayLike<number>): Required<Band> {
  const [p10, p50, p90] = quantiles(values, [0.1, 0.5, 0.9]);
  return { p10, p50, p90 };
}
