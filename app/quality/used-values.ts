import type { SampledChannels } from "./samples";
import type { JudgedChannel } from "./judge-storm";
import { FAIL, MISSING, SUSPECT } from "./flags";

/** Estimates use what is good, not evaluated or suspect; bad counts as missing, suspect too where a storm leaves it out. */
export function isUsed(flag: number, leaveOutSuspect: boolean): boolean {
  return flag !== FAIL && flag !== MISSING && !(leaveOutSuspect && flag === SUSPECT);
}

/** The samples that an estimate uses, without channels that have none left. */
export function usedSamples(judged: readonly JudgedChannel[], leaveOutSuspect: boolean): SampledChannels {
  const channels: SampledChannels = {};
  for (const { channel, time, values, inForce } of judged) {
    const used = (_: number, k: number) => isUsed(inForce[k], leaveOutSuspect) && !Number.isNaN(values[k]);
    const samples = { time: time.filter(used), values: values.filter(used) };
    if (samples.time.length > 0) channels[channel] = samples;
  }
  return channels;
}
