import { OceanError } from "../errors";
import { headlineOf } from "../headline/headline";
import { responseSeries } from "../headline/response-series";
import { runModel } from "../models/run-model";
import { BAND_NAMES, type BandName, type Headline, type SeriesName } from "../response";
import type { Scenario } from "../scenario";

/** The headline figures and the series of one run. */
export interface MemberResult {
  headline: Headline;
  series: Record<SeriesName, number[]>;
}

/**
 * Runs one member. It may fall over an edge that the scenario itself does not, such as a thinner layer that evaporates away.
 * @returns the refusal there
 */
export function runMember(scenario: Scenario): MemberResult | OceanError {
  try {
    const run = runModel(scenario);
    const series = responseSeries(scenario, run);
    return { headline: headlineOf(scenario, run, series), series };
  } catch (error) {
    if (error instanceof OceanError) return error;
    throw error;
  }
}

/** Samples kept of every series at most: a figure shows no more. */
const MOST_SAMPLES = 500;
/** Numbers kept of every series at most, so that the greatest ensemble of a long storm fits into memory. */
const MOST_VALUES = 1e6;

/** One sample of a series, or of the size of the vector that two of them make. */
function sampleOf(series: Record<SeriesName, number[]>, name: BandName, k: number): number {
  if (name === "stress") return Math.hypot(series.stressX[k], series.stressY[k]);
  if (name === "driftSpeed") return Math.hypot(series.driftEast[k], series.driftNorth[k]);
  return series[name][k];
}

/** The series of many members at some of the storm's samples, one array a series, sample by sample. */
export class MemberSeries {
  /** Which of the storm's samples are kept. */
  readonly samples: number[];
  private readonly kept: Record<BandName, Float64Array>;
  private readonly members: number;
  private count = 0;

  constructor(members: number, length: number) {
    const every = Math.ceil(length / Math.min(MOST_SAMPLES, Math.floor(MOST_VALUES / members)));
    this.members = members;
    this.samples = Array.from({ length }, (_, k) => k).filter((k) => k % every === 0 || k === length - 1);
    const room = () => new Float64Array(members * this.samples.length);
    this.kept = Object.fromEntries(BAND_NAMES.map((name) => [name, room()])) as Record<BandName, Float64Array>;
  }

  add(series: Record<SeriesName, number[]>): void {
    for (const name of BAND_NAMES) {
      const into = this.kept[name];
      for (let k = 0; k < this.samples.length; k++) {
        into[k * this.members + this.count] = sampleOf(series, name, this.samples[k]);
      }
    }
    this.count += 1;
  }

  /** All members' values of a series at one of the kept samples. */
  at(name: BandName, sample: number): Float64Array {
    const start = sample * this.members;
    return this.kept[name].subarray(start, start + this.count);
  }
}
