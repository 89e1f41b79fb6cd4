import type { ChannelSeries } from "./channel-series";
import { stretchesStoodFor, type Stretch } from "./stood-for";
import { withinWindow, type StormWindow } from "./storm-window";

/** m/s. Weaker wind has no direction worth telling: less than 1 kn is reported as calm (WMO-No. 8, from memory). */
export const CALM_BELOW = 0.5;
const SECTORS = 16;

/** How long the wind blew, from where and how hard. Times in seconds. */
export interface WindShares {
  /** m/s, from which each class of speed begins; the first is 0. */
  classes: number[];
  /** One row for each of 16 directions that the wind came from, from north clockwise; in it one value a class. */
  sectors: number[][];
  calm: number;
  /** Wind without a direction on record. */
  directionless: number;
  /** All of the above. */
  total: number;
  /** For each class but the first: how long the wind was as strong or stronger, and the longest time on end. */
  exceedance: { threshold: number; time: number; longest: number }[];
}

/**
 * Shares of the window's time by direction and speed.
 * @param classes m/s, ascending, the first 0
 * @returns null where no wind is on record in the window
 */
export function windShares(
  series: readonly ChannelSeries[],
  window: StormWindow,
  classes: readonly number[],
): WindShares | null {
  const inside = series.map((entry) => withinWindow(entry, window));
  const speed = inside.find(({ channel }) => channel === "windSpeed");
  if (!speed || speed.time.length === 0) return null;
  const direction = inside.find(({ channel }) => channel === "windFrom");
  const fromAt = new Map(Array.from(direction?.time ?? [], (at, index) => [at, direction!.values[index]]));
  const stretches = stretchesStoodFor(speed.time, window);
  const shares: WindShares = {
    classes: [...classes],
    sectors: Array.from({ length: SECTORS }, () => classes.map(() => 0)),
    calm: 0,
    directionless: 0,
    total: 0,
    exceedance: classes.slice(1).map((threshold) => ({ threshold, ...spellsOf(speed.values, stretches, threshold) })),
  };
  stretches.forEach((stretch, index) => {
    const [length, value] = [stretch.to - stretch.from, speed.values[index]];
    const from = fromAt.get(speed.time[index]);
    shares.total += length;
    if (value < CALM_BELOW) shares.calm += length;
    else if (from === undefined) shares.directionless += length;
    else shares.sectors[sectorOf(from)][classOf(value, classes)] += length;
  });
  return shares;
}

function sectorOf(from: number): number {
  return Math.round((((from % 360) + 360) % 360) / (360 / SECTORS)) % SECTORS;
}

function classOf(value: number, classes: readonly number[]): number {
  return classes.findLastIndex((lower) => value >= lower);
}

function spellsOf(values: Float64Array, stretches: readonly Stretch[], threshold: number) {
  let [time, longest, spell, lastEnd] = [0, 0, 0, Number.NaN];
  stretches.forEach(({ from, to }, index) => {
    if (values[index] < threshold) return;
    // Two halves of one pause may miss each other by a rounding.
    spell = Math.abs(from - lastEnd) < 1e-3 ? spell + (to - from) : to - from;
    lastEnd = to;
    time += to - from;
    longest = Math.max(longest, spell);
  });
  return { time, longest };
}
