import Papa from "papaparse";
import type { ProblemList } from "../problem-list";
import type { SourceFile } from "../source-file";
import type { RawFix, RawTracks } from "./raw-track";
import type { TrackAnswers, WindRadii } from "./track-reading";
import { knots, nauticalMiles, numberOf, wrapped } from "./track-text";

const HEADER = /^\uFEFF?SID,.*\bISO_TIME\b.*\bLAT\b.*\bLON\b/;

/**
 * Agencies of the archive with the averaging of their maximum wind, minutes; the archive's own column takes over that of
 * the agency responsible for the basin.
 * Source: NCEI, "IBTrACS version 4 column documentation".
 */
const AGENCIES: readonly { id: string; label: string; minutes: number | null }[] = [
  { id: "USA", label: "agencies of the United States, 1-minute mean", minutes: 1 },
  { id: "TOKYO", label: "Tokyo, 10-minute mean", minutes: 10 },
  { id: "CMA", label: "China, 2-minute mean", minutes: 2 },
  { id: "HKO", label: "Hong Kong, 10-minute mean", minutes: 10 },
  { id: "KMA", label: "Korea, 10-minute mean", minutes: 10 },
  { id: "NEWDELHI", label: "New Delhi, 3-minute mean", minutes: 3 },
  { id: "REUNION", label: "La Réunion, 10-minute mean", minutes: 10 },
  { id: "BOM", label: "Australia, 10-minute mean", minutes: 10 },
  { id: "NADI", label: "Fiji, 10-minute mean", minutes: 10 },
  { id: "WELLINGTON", label: "New Zealand, 10-minute mean", minutes: 10 },
  { id: "WMO", label: "the agency responsible for the basin, its own averaging", minutes: null },
];

/** Whether the text is the archive's CSV form. */
export function isArchiveCsv(source: SourceFile): boolean {
  return HEADER.test(source.lines[0] ?? "");
}

type Row = Record<string, string>;

/** Reads the archive's CSV: one row a time, several agencies side by side, units in the second row where it has one. */
export function readArchiveCsv(source: SourceFile, answers: TrackAnswers, problems: ProblemList): RawTracks {
  const { data } = Papa.parse<string[]>(source.decoded.text, { skipEmptyLines: false });
  const names = (data[0] ?? []).map((name) => name.trim());
  const rows = data.slice(1).map((cells, index) => ({
    row: index + 2,
    blank: cells.every((cell) => cell.trim() === ""),
    cells: Object.fromEntries(names.map((name, column): [string, string] => [name, cells[column] ?? ""])),
  }));
  const records = rows.filter(({ cells, row, blank }) => !blank && !(row === 2 && /degree/i.test(cells.LAT ?? "")));
  const told = AGENCIES.filter(({ id }) =>
    records.some(({ cells }) => numberOf(cells[`${id}_WIND`]) !== null || numberOf(cells[`${id}_PRES`]) !== null),
  );
  const agency = told.find(({ id }) => id === answers.agency) ?? told[0] ?? AGENCIES[AGENCIES.length - 1];
  const fixes: RawFix[] = [];
  for (const { cells, row } of records) {
    const fix = fixOf(cells, row, agency.id);
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
  return {
    fixes,
    averagingMinutes: agency.minutes,
    understood: [
      { what: "Wind and pressure of", taken: agency.label, confidence: answers.agency ? "answered" : "assumed" },
      { what: "Missing values", taken: "blank", confidence: "by the format" },
    ],
    questions:
      told.length < 2
        ? []
        : [
            {
              key: "agency",
              needed: answers.agency === undefined,
              message: "Several agencies have analysed this storm. Whose wind and pressure are wanted?",
              options: told.map(({ id, label }) => ({ value: id, label })),
              suggestion: agency.id,
              ...(answers.agency !== undefined && { answer: answers.agency }),
            },
          ],
  };
}

function fixOf(cells: Row, row: number, agency: string): RawFix | null {
  const stamp = /^(\d{4})-(\d{2})-(\d{2}) (\d{2}):(\d{2}):(\d{2})$/.exec((cells.ISO_TIME ?? "").trim());
  const time = stamp
    ? Date.parse(`${stamp[1]}-${stamp[2]}-${stamp[3]}T${stamp[4]}:${stamp[5]}:${stamp[6]}Z`) / 1000
    : NaN;
  const [latitude, longitude] = [numberOf(cells.LAT), numberOf(cells.LON)];
  if (!Number.isFinite(time) || latitude === null || longitude === null || Math.abs(latitude) > 90) return null;
  const own = (name: string) => numberOf(cells[`${agency}_${name}`], [-999, -99]);
  return {
    stormId: (cells.SID ?? "").trim(),
    stormName: (cells.NAME ?? "").trim(),
    row,
    fix: {
      time,
      latitude,
      longitude: wrapped(longitude),
      maxWind: knots(own("WIND")),
      centralPressure: own("PRES"),
      radii: [34, 50, 64].flatMap((wind): WindRadii[] => {
        const [ne, se, sw, nw] = ["NE", "SE", "SW", "NW"].map((quadrant) => nauticalMiles(own(`R${wind}_${quadrant}`)));
        const speed = knots(wind);
        if (speed === null || [ne, se, sw, nw].every((value) => value === null)) return [];
        return [{ wind: speed, quadrants: [ne, se, sw, nw] }];
      }),
      ambientPressure: own("POCI"),
      radiusOfMaximumWind: nauticalMiles(own("RMW")),
    },
  };
}
