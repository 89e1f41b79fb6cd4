import type { ProblemList } from "../problem-list";
import type { SourceFile } from "../source-file";
import type { RawFix, RawTracks } from "./raw-track";
import type { WindRadii } from "./track-reading";
import { knots, moment, nauticalMiles, numberOf, position, wrapped } from "./track-text";

const LINE = /^\s*[A-Z]{2}\s*,\s*\d{1,2}\s*,\s*\d{10}\s*,/;

/** Whether lines are those of a tropical cyclone deck: basin, number, time as ten digits, technique. */
export function isDeckText(source: SourceFile): boolean {
  const lines = source.lines.filter((line) => line.trim() !== "").slice(0, 20);
  return lines.length > 0 && lines.filter((line) => LINE.test(line)).length >= 0.8 * lines.length;
}

/**
 * Reads best-track lines of a tropical cyclone deck: several lines a time where wind radii are told, positions in tenths
 * of a degree, knots, nautical miles, zero for missing.
 * Source: NOAA/NRL, "ATCF B-deck format" (field list).
 */
export function readDeckText(source: SourceFile, problems: ProblemList): RawTracks {
  const fixes: RawFix[] = [];
  for (const [index, line] of source.lines.entries()) {
    if (line.trim() === "") continue;
    const row = index + 1;
    const cells = line.split(",").map((cell) => cell.trim());
    const fix = fixOf(cells, row);
    if (fix === null) {
      problems.add(
        "error",
        "unreadableFix",
        "the line has no time and position that can be read",
        "Correct the line, or leave it out of the file.",
        { row },
      );
    } else if (cells[4] !== "BEST") {
      problems.add("note", "notBestTrack", `a line of the technique “${cells[4]}”`, "It was passed over.", { row });
    } else fixes.push(fix);
  }
  return {
    fixes,
    averagingMinutes: 1,
    understood: [
      { what: "Maximum wind", taken: "knots, 1-minute mean, anywhere in the storm", confidence: "by the format" },
      { what: "Missing values", taken: "0, by column", confidence: "by the format" },
    ],
    questions: [],
  };
}

function fixOf(cells: readonly string[], row: number): RawFix | null {
  const stamp = /^(\d{4})(\d{2})(\d{2})(\d{2})$/.exec(cells[2] ?? "");
  const time =
    stamp && moment(Number(stamp[1]), Number(stamp[2]), Number(stamp[3]), Number(stamp[4]), minutesOf(cells[3]));
  const [latitude, longitude] = [position(cells[6], 10), position(cells[7], 10)];
  if (time === null || latitude === null || longitude === null) return null;
  const name = cells[27] ?? "";
  return {
    stormId: `${cells[0]}${(cells[1] ?? "").padStart(2, "0")}${stamp?.[1] ?? ""}`,
    stormName: name,
    row,
    fix: {
      time,
      latitude,
      longitude: wrapped(longitude),
      maxWind: knots(numberOf(cells[8], [0])),
      centralPressure: numberOf(cells[9], [0]),
      radii: radiiOf(cells),
      ambientPressure: numberOf(cells[17], [0]),
      radiusOfMaximumWind: nauticalMiles(numberOf(cells[19], [0])),
    },
  };
}

/** A time that is not on the hour has its minutes in the field of the technique's number. */
function minutesOf(text: string | undefined): number {
  return numberOf(text) ?? 0;
}

function radiiOf(cells: readonly string[]): WindRadii[] {
  const wind = knots(numberOf(cells[11], [0]));
  if (wind === null || cells[12] === "") return [];
  const radius = (at: number) => nauticalMiles(numberOf(cells[at], [0]));
  const whole = cells[12] === "AAA";
  const quadrants: WindRadii["quadrants"] = [
    radius(13),
    radius(whole ? 13 : 14),
    radius(whole ? 13 : 15),
    radius(whole ? 13 : 16),
  ];
  return quadrants.every((value) => value === null) ? [] : [{ wind, quadrants }];
}
