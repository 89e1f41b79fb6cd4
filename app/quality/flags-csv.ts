import { csvCell } from "~/figures/csv-cell";
import { CHANNELS } from "~/storms/channels";
import type { SamplePlace } from "./find-samples";
import { TEST_NAMES } from "./thresholds";

const LINE_END = "\r\n";

const HEADER = [
  "time (UTC)",
  "channel",
  "value",
  "unit",
  "flag in force",
  "flag of the tests",
  ...TEST_NAMES.map((test) => `flag of ${test}`),
  "reason of the person who set it",
];

/**
 * Samples with their flags as CSV after RFC 4180: a line each, ISO UTC, values unrounded in the channel's own unit, flags as
 * numbers (1 good, 2 not evaluated, 3 suspect or of high interest, 4 bad, 9 missing); empty where a test was not made.
 */
export function flagsCsv(
  places: readonly SamplePlace[],
  setAt: (place: SamplePlace) => { reason: string } | null,
): string {
  const lines = [HEADER.map(csvCell).join(",")];
  for (const place of places) {
    const { judged, k } = place;
    const { channel, unit, time, values, flags, inForce, tests } = judged;
    lines.push(
      [
        new Date(time[k] * 1000).toISOString(),
        csvCell(CHANNELS[channel].label),
        // Not by `csvCell`, which would take a minus for the start of a formula.
        Number.isNaN(values[k]) ? "" : values[k],
        unit,
        inForce[k],
        flags[k],
        ...TEST_NAMES.map((name) => tests.find(({ test }) => test === name)?.flags[k] ?? ""),
        csvCell(setAt(place)?.reason ?? ""),
      ].join(","),
    );
  }
  return lines.join(LINE_END) + LINE_END;
}
