import { GAP_STEPS, longestBridged } from "~/quality/gap-rule";
import { medianStep, type ChannelSeries } from "./channel-series";
import type { StormWindow } from "./storm-window";

/** A sum as it grows: straight between its times. */
export interface RunningTotal {
  /** Seconds since 1970-01-01T00:00:00Z, ascending. */
  time: Float64Array;
  values: Float64Array;
}

type Samples = Pick<ChannelSeries, "time" | "values">;

const HOUR = 3600;
/** mm from rates in mm/h that hold until the next time, but not across a gap, nor beyond the window. */
export function runningRain({ time, values }: Samples, window: StormWindow): RunningTotal {
  const step = medianStep(time) ?? HOUR;
  const total = new Growing();
  values.forEach((rate, index) => {
    const next = index + 1 < time.length ? time[index + 1] : time[index] + step;
    const held = next - time[index] > GAP_STEPS * step ? step : next - time[index];
    const inside = Math.max(0, Math.min(held, window.endsAt - time[index]));
    total.pass(time[index]);
    total.grow(time[index] + inside, (rate * inside) / HOUR);
  });
  return total.finish();
}

/** J/m² from W/m² that change evenly from sample to sample; nothing is added across a pause that is not bridged. */
export function runningHeat({ time, values }: Samples): RunningTotal {
  const longest = longestBridged("netHeat", time);
  const total = new Growing();
  values.forEach((flux, index) => {
    const pause = index === 0 ? Infinity : time[index] - time[index - 1];
    if (pause > longest) total.pass(time[index]);
    else total.grow(time[index], ((flux + values[index - 1]) / 2) * pause);
  });
  return total.finish();
}

/** Value of a total at any time: none before its first, its last for ever after. */
export function totalAt({ time, values }: RunningTotal, at: ArrayLike<number>): Float64Array {
  let after = 0;
  return Float64Array.from(at, (seconds) => {
    while (after < time.length && time[after] <= seconds) after += 1;
    if (after === 0) return 0;
    if (after === time.length) return values[after - 1];
    const share = (seconds - time[after - 1]) / (time[after] - time[after - 1]);
    return values[after - 1] + share * (values[after] - values[after - 1]);
  });
}

class Growing {
  private readonly time: number[] = [];
  private readonly values: number[] = [];
  private sum = 0;

  /** To a later time without growing. */
  pass(seconds: number): void {
    this.grow(seconds, 0);
  }

  grow(seconds: number, amount: number): void {
    this.sum += amount;
    if (this.time.at(-1) === seconds) this.values[this.values.length - 1] = this.sum;
    else {
      this.time.push(seconds);
      this.values.push(this.sum);
    }
  }

  finish(): RunningTotal {
    return { time: Float64Array.from(this.time), values: Float64Array.from(this.values) };
  }
}
