import { OceanError } from "../errors";
import { requireFinite, requireLatitude } from "../guards";

/** A cyclone's centre at one moment. */
export interface CycloneFix {
  /** Seconds from any origin, strictly ascending along a track. */
  time: number;
  /** degrees */
  latitude: number;
  longitude: number;
  /** The strongest wind anywhere in the storm, m/s; null where not told, as are the next. */
  maxWind: number | null;
  /** hPa */
  centralPressure: number | null;
  /** m */
  radiusOfMaximumWind: number | null;
  /** hPa */
  ambientPressure: number | null;
}

type Told = "maxWind" | "centralPressure" | "radiusOfMaximumWind" | "ambientPressure";

/** A cyclone between its fixes. */
export interface CycloneState extends CycloneFix {
  /** m/s */
  translationSpeed: number;
  /** degrees true, the way it goes */
  translationTo: number;
  /** hPa/h; negative while deepening */
  deepening: number;
}

/** Mean radius of the Earth, m (IUGG). */
const EARTH_RADIUS = 6_371_008.8;
const RADIANS = Math.PI / 180;
const HALF_HOUR = 1800;

/**
 * Where a place lies from a centre, along the great circle that joins them.
 * @returns dx, dy m, east and north at the centre
 */
export function fromCentre(
  centre: { latitude: number; longitude: number },
  place: { latitude: number; longitude: number },
): { dx: number; dy: number } {
  const [from, to] = [centre.latitude * RADIANS, place.latitude * RADIANS];
  const turn = (place.longitude - centre.longitude) * RADIANS;
  const east = Math.cos(to) * Math.sin(turn);
  const north = Math.cos(from) * Math.sin(to) - Math.sin(from) * Math.cos(to) * Math.cos(turn);
  const across = Math.hypot(east, north);
  if (across === 0) return { dx: 0, dy: 0 };
  const along = Math.sin(from) * Math.sin(to) + Math.cos(from) * Math.cos(to) * Math.cos(turn);
  const metres = EARTH_RADIUS * Math.atan2(across, along);
  return { dx: (metres * east) / across, dy: (metres * north) / across };
}

/**
 * Reads a track at any moment: each quantity on the straight line between the fixes that tell it, and as at its first or
 * last telling beyond them; the motion on the straight line between the fixes' own, so that it has no jumps.
 * @returns the state at a time within the track, in the fixes' units
 * @throws OceanError INVALID_INPUT for fewer than two fixes, times out of order, or positions that are none
 */
export function trackReader(fixes: readonly CycloneFix[]): (time: number) => CycloneState {
  requireTrack(fixes);
  const times = fixes.map(({ time }) => time);
  const latitudes = fixes.map(({ latitude }) => latitude);
  const longitudes = unwrapped(fixes);
  const motions = motionsOf(fixes);
  const east = motions.map((motion) => motion.east);
  const north = motions.map((motion) => motion.north);
  const told = (name: Told) => {
    const telling = fixes.filter((fix) => fix[name] !== null);
    const at = telling.map(({ time }) => time);
    const values = telling.map((fix) => fix[name] ?? Number.NaN);
    return (time: number) => (telling.length === 0 ? null : onLine(at, values, time));
  };
  const [maxWind, centralPressure] = [told("maxWind"), told("centralPressure")];
  const [radiusOfMaximumWind, ambientPressure] = [told("radiusOfMaximumWind"), told("ambientPressure")];
  return (time) => {
    const [u, v] = [onLine(times, east, time), onLine(times, north, time)];
    const later = centralPressure(time + HALF_HOUR);
    const earlier = centralPressure(time - HALF_HOUR);
    return {
      time,
      latitude: onLine(times, latitudes, time),
      longitude: onLine(times, longitudes, time),
      maxWind: maxWind(time),
      centralPressure: centralPressure(time),
      radiusOfMaximumWind: radiusOfMaximumWind(time),
      ambientPressure: ambientPressure(time),
      translationSpeed: Math.hypot(u, v),
      translationTo: (Math.atan2(u, v) / RADIANS + 360) % 360,
      deepening: later === null || earlier === null ? 0 : later - earlier,
    };
  };
}

function requireTrack(fixes: readonly CycloneFix[]): void {
  if (fixes.length < 2) throw new OceanError("INVALID_INPUT", "A track needs at least two fixes.");
  fixes.forEach(({ time, latitude, longitude }, k) => {
    requireFinite({ time, longitude });
    requireLatitude(latitude);
    if (k > 0 && !(time > fixes[k - 1].time)) {
      throw new OceanError("INVALID_INPUT", `The fixes of a track must ascend in time; fix ${k + 1} does not.`);
    }
  });
}

/** Longitudes that go on across 180°. */
function unwrapped(fixes: readonly CycloneFix[]): number[] {
  const longitudes: number[] = [];
  for (const { longitude } of fixes) {
    const before = longitudes.at(-1) ?? longitude;
    longitudes.push(before + ((((longitude - before + 180) % 360) + 360) % 360) - 180);
  }
  return longitudes;
}

/** m/s at each fix: the mean of the ways before and after it, weighed by their time. */
function motionsOf(fixes: readonly CycloneFix[]): { east: number; north: number }[] {
  return fixes.map((fix, k) => {
    const [before, after] = [fixes[Math.max(0, k - 1)], fixes[Math.min(fixes.length - 1, k + 1)]];
    const seconds = after.time - before.time;
    const [back, on] = [fromCentre(fix, before), fromCentre(fix, after)];
    return { east: (on.dx - back.dx) / seconds, north: (on.dy - back.dy) / seconds };
  });
}

function onLine(times: readonly number[], values: readonly number[], time: number): number {
  if (time <= times[0]) return values[0];
  const last = times.length - 1;
  if (time >= times[last]) return values[last];
  let [low, high] = [0, last];
  while (high - low > 1) {
    const middle = (low + high) >> 1;
    if (times[middle] <= time) low = middle;
    else high = middle;
  }
  return values[low] + ((values[high] - values[low]) * (time - times[low])) / (times[high] - times[low]);
}
