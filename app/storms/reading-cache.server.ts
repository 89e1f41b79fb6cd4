import type { SeriesReading } from "~/readers/reading";

/** Numbers kept at most, over all readings: about 64 MB. */
const MOST_NUMBERS = 8_000_000;
const MOST_READINGS = 24;

/** The last readings by what they were made from; the one used longest ago goes first. */
const kept = new Map<string, SeriesReading>();

function numbersIn(reading: SeriesReading): number {
  return reading.time.length * (1 + Object.keys(reading.channels).length);
}

function numbersKept(): number {
  return [...kept.values()].reduce((sum, reading) => sum + numbersIn(reading), 0);
}

/** A reading is a pure function of its key, so that it never goes stale. What cannot be read is not kept. */
export function cachedReading(key: string, read: () => SeriesReading): SeriesReading {
  const reading = kept.get(key) ?? read();
  kept.delete(key);
  kept.set(key, reading);
  while (kept.size > 1 && (kept.size > MOST_READINGS || numbersKept() > MOST_NUMBERS)) {
    const [oldest] = kept.keys();
    kept.delete(oldest);
  }
  return reading;
}
