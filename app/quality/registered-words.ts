/** The registered quality of a record's series in sentences, for a response's inputs and a memo's register. */
import { CHANNELS } from "~/storms/channels";
import { formatQuantity } from "~/units/format-quantity";
import { formatPeriod, formatTime } from "~/units/format-time";
import { DEFAULT_UNITS } from "~/units/unit-choices";
import { FAIL, FLAG_WORDS, PASS, SUSPECT } from "./flags";
import type { RegisteredQuality } from "./register-quality";

const percent = (share: number) => formatQuantity(share, "share", DEFAULT_UNITS, { decimals: 1 }).text;

/** One sentence a channel: `wind speed: 117 good, 2 suspect, 0 bad; 1.7 % missing or left out`. */
export function qualityLines({ channels, thresholdsVersion }: RegisteredQuality, recordId: string): string[] {
  const own = channels.filter((entry) => entry.recordId === recordId);
  if (own.length === 0) return [];
  const by = thresholdsVersion === 0 ? "the default thresholds" : `thresholds version ${thresholdsVersion}`;
  return [
    ...own.map(({ channel, counts, overridden, shareMissing }) => {
      const set = overridden > 0 ? `, ${overridden} of them set by a person` : "";
      return `${CHANNELS[channel].label}: ${counts[PASS]} good, ${counts[SUSPECT]} suspect, ${counts[FAIL]} bad${set}; ${percent(shareMissing)} missing or left out`;
    }),
    `by ${by}`,
  ];
}

/** One sentence a reason: `3 values of the wind speed, 2026-11-03 …, set to bad: hit by spray`. */
export function overrideLines({ overrides = [] }: RegisteredQuality, recordId: string, zone: string): string[] {
  return overrides
    .filter((entry) => entry.recordId === recordId)
    .map(
      ({ channel, flag, reason, by, setAt, count, first, last }) =>
        `${count} ${count === 1 ? "value" : "values"} of the ${CHANNELS[channel].label}, ${formatPeriod(first, last, zone)}, set to ${FLAG_WORDS[flag]}${by && setAt ? ` by ${by}, ${formatTime(setAt, zone)}` : ""}: ${reason}`,
    );
}

/** What was decided on the storm's series as a whole. */
export function decisionLines({ leaveOutSuspect, missingAccepted }: RegisteredQuality): string[] {
  return [
    leaveOutSuspect ? "Suspect values are left out." : "Suspect values are kept.",
    ...(missingAccepted
      ? [
          `${missingAccepted.by} took it on to estimate with up to ${percent(missingAccepted.upTo)} missing, ${formatTime(missingAccepted.at, "UTC")}: ${missingAccepted.reason}`,
        ]
      : []),
  ];
}
