/** A storm's track as its page shows it: rows and parameters as fields hold them, and what the map draws. */
import { offsetPosition } from "~/area/offset-position";
import { TRACK_NUMBERS, type TrackNumber, type TrackParameters } from "~/ocean/cyclone/track-parameters";
import type { Position } from "~/ocean/scenario";
import type { TrackFix, WindRadii } from "~/readers/tracks/track-reading";
import { formatQuantity, toDisplay } from "~/units/format-quantity";
import type { UnitChoices } from "~/units/unit-choices";
import type { FixRow } from "./posted-track";
import { wallClock } from "./storm-window";

/** As short as it stays the same to three decimals. */
function plain(value: number | null): string {
  return value === null ? "" : String(Number(value.toFixed(3)));
}

export function fixRows(fixes: readonly TrackFix[], units: UnitChoices): FixRow[] {
  return fixes.map((fix) => ({
    time: wallClock(fix.time, "UTC"),
    latitude: plain(fix.latitude),
    longitude: plain(fix.longitude),
    centralPressure: plain(fix.centralPressure),
    maxWind: plain(fix.maxWind === null ? null : toDisplay(fix.maxWind, "windSpeed", units)),
    radiusOfMaximumWind: plain(
      fix.radiusOfMaximumWind === null ? null : toDisplay(fix.radiusOfMaximumWind, "distance", units),
    ),
  }));
}

export function parameterValues(parameters: TrackParameters): Record<TrackNumber, string> {
  const shown = (name: TrackNumber) => {
    const value = parameters[name];
    return value === null ? "" : plain(value / TRACK_NUMBERS[name].toSi);
  };
  return {
    B: shown("B"),
    radiusOfMaximumWind: shown("radiusOfMaximumWind"),
    ambientPressure: shown("ambientPressure"),
    averagingFactor: shown("averagingFactor"),
    reduction: shown("reduction"),
    inflowAngle: shown("inflowAngle"),
    asymmetry: shown("asymmetry"),
    airDensity: shown("airDensity"),
  };
}

export interface TrackDrawing {
  /** [longitude, latitude], going on across 180°. */
  line: Position[];
  dayMarks: { position: Position; label: string }[];
  /** Radii of the strongest wind or, where told, of the weakest wind that has radii. */
  rings: Position[][];
}

const DAY = 86_400;
/** More rings than this would hide the sea. */
const MOST_RINGS = 24;
const CORNERS = 48;

export function drawTrack(fixes: readonly TrackFix[], parameters: TrackParameters): TrackDrawing {
  const line: Position[] = [];
  for (const { longitude, latitude } of fixes) {
    const before = line.at(-1)?.[0] ?? longitude;
    line.push([before + ((((longitude - before + 180) % 360) + 360) % 360) - 180, latitude]);
  }
  const every = Math.ceil(fixes.length / MOST_RINGS);
  return {
    line,
    dayMarks: fixes.flatMap(({ time }, k) =>
      k === 0 || Math.floor(time / DAY) !== Math.floor(fixes[k - 1].time / DAY)
        ? [{ position: line[k], label: `${wallClock(time, "UTC").slice(5)} UTC` }]
        : [],
    ),
    rings: fixes.flatMap((fix, k) => (k % every === 0 ? [ringOf(fix, line[k], parameters)] : [])),
  };
}

function ringOf(
  { radii, radiusOfMaximumWind }: TrackFix,
  [longitude, latitude]: Position,
  parameters: TrackParameters,
) {
  const outer = weakest(radii);
  const around = radiusOfMaximumWind ?? parameters.radiusOfMaximumWind;
  return Array.from({ length: CORNERS + 1 }, (_, corner): Position => {
    const bearing = (corner % CORNERS) * ((2 * Math.PI) / CORNERS);
    const radius = outer ? (outer.quadrants[Math.floor((corner % CORNERS) / (CORNERS / 4))] ?? 0) : around;
    return offsetPosition(longitude, latitude, radius * Math.sin(bearing), radius * Math.cos(bearing));
  });
}

function weakest(radii: readonly WindRadii[]): WindRadii | null {
  return [...radii].sort((a, b) => a.wind - b.wind)[0] ?? null;
}

/** The radii of a fix in words, as `17.5 m/s: 110, 90, 60, 100 km`; empty where none is told. */
export function radiiWords({ radii }: TrackFix, units: UnitChoices): string {
  return radii
    .map(({ wind, quadrants }) => {
      const each = quadrants.map((radius) => (radius === null ? "–" : formatQuantity(radius, "distance", units).text));
      return `${formatQuantity(wind, "windSpeed", units).text}: ${each.join(", ")}`;
    })
    .join("; ");
}
