import type { ProblemList } from "../problem-list";
import type { SourceFile } from "../source-file";
import type { RawFix, RawTracks } from "./raw-track";
import type { WindRadii } from "./track-reading";
import { knots, moment, nauticalMiles, numberOf, position, wrapped } from "./track-text";

const HEADER = /^\s*([A-Z]{2}\d{6})\s*,\s*([^,]*?)\s*,\s*(\d+)\s*,?\s*$/;
const MISSING = [-999, -99];

/** Whether the text begins with a storm's header: basin, number and year, name, how many lines follow. */
export function isHeadedText(source: SourceFile): boolean {
  return HEADER.test(source.lines.find((line) => line.trim() !== "") ?? "");
}

/**
 * Reads the hurricane database text: a header a storm, then its fixes. Rows between the synoptic hours (landfalls) are kept.
 * Source: NHC, "The revised Atlantic hurricane database (HURDAT2)", format description.
 */
export function readHeadedText(source: SourceFile, problems: ProblemList): RawTracks {
  const fixes: RawFix[] = [];
  let storm: { id: string; name: string; declared: number; row: number; found: number } | null = null;
  const close = () => {
    if (storm && storm.found !== storm.declared) {
      problems.add(
        "warning",
        "lineCount",
        `${storm.id} should have ${storm.declared} lines and has ${storm.found}`,
        "Check that the file was copied whole.",
        { row: storm.row },
      );
    }
  };
  for (const [index, line] of source.lines.entries()) {
    if (line.trim() === "") continue;
    const row = index + 1;
    const header = HEADER.exec(line);
    if (header) {
      close();
      storm = { id: header[1], name: header[2], declared: Number(header[3]), row, found: 0 };
      continue;
    }
    if (storm) storm.found += 1;
    const fix =
      storm &&
      fixOf(
        line.split(",").map((cell) => cell.trim()),
        row,
        storm,
      );
    if (fix) fixes.push(fix);
    else {
      problems.add(
        "error",
        "unreadableFix",
        "the line has no time and position that can be read",
        "Correct the line, or leave it out of the file.",
        { row },
      );
    }
  }
  close();
  return {
    fixes,
    averagingMinutes: 1,
    understood: [
      { what: "Maximum wind", taken: "knots, 1-minute mean, anywhere in the storm", confidence: "by the format" },
      { what: "Missing values", taken: "−999 and −99", confidence: "by the format" },
    ],
    questions: [],
  };
}

function fixOf(cells: readonly string[], row: number, storm: { id: string; name: string }): RawFix | null {
  const date = /^(\d{4})(\d{2})(\d{2})$/.exec(cells[0] ?? "");
  const clock = /^(\d{2})(\d{2})$/.exec(cells[1] ?? "");
  const time =
    date && clock
      ? moment(Number(date[1]), Number(date[2]), Number(date[3]), Number(clock[1]), Number(clock[2]))
      : null;
  const [latitude, longitude] = [position(cells[4]), position(cells[5])];
  if (time === null || latitude === null || longitude === null) return null;
  return {
    stormId: storm.id,
    stormName: storm.name,
    row,
    fix: {
      time,
      latitude,
      longitude: wrapped(longitude),
      maxWind: knots(numberOf(cells[6], MISSING)),
      centralPressure: numberOf(cells[7], MISSING),
      radii: [34, 50, 64].flatMap((wind, k) => radiiOf(wind, cells.slice(8 + 4 * k, 12 + 4 * k))),
      ambientPressure: null,
      radiusOfMaximumWind: nauticalMiles(numberOf(cells[20], MISSING)),
    },
  };
}

function radiiOf(windKnots: number, cells: readonly string[]): WindRadii[] {
  const wind = knots(windKnots);
  const [ne, se, sw, nw] = [0, 1, 2, 3].map((k) => nauticalMiles(numberOf(cells[k], [...MISSING, 0])));
  if (wind === null || [ne, se, sw, nw].every((value) => value === null)) return [];
  return [{ wind, quadrants: [ne, se, sw, nw] }];
}
