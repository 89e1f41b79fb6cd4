import type { ProblemList } from "../problem-list";
import { UnreadableFile, type ReadingAnswers, type SeriesReading } from "../reading";
import { isSizeAllowed, MAX_SERIES_FILE_LINES } from "../source-file";
import { boundsOfAxis, chooseAxis, stampsOfAxis, timeAxesOf, type TimeAxis } from "./cf-axes";
import { columnsOf } from "./cf-columns";
import { DamagedNetcdf, type NetcdfFile, type NetcdfVariable } from "./netcdf-file";
import { openNetcdf } from "./open-netcdf";
import { seriesAlong } from "./series-along";

/**
 * Reads a NetCDF file by the CF conventions as a record of one place: classic (CDF-1, CDF-2) and NetCDF-4. What the
 * attributes say is taken and told; what they leave open is asked: the place of several, how amounts add up, the sense
 * of a flux.
 * @throws UnreadableFile where the file is damaged, has no times of the calendar in use, or no records
 */
export function readNetcdf(
  bytes: Uint8Array,
  fileName: string,
  answers: ReadingAnswers,
  problems: ProblemList,
): SeriesReading {
  const refuse = (code: string, what: string, toDo: string): never => {
    problems.add("error", code, what, toDo);
    throw new UnreadableFile(problems.toArray());
  };
  if (!isSizeAllowed(bytes, fileName, problems)) throw new UnreadableFile(problems.toArray());
  let file: NetcdfFile | undefined;
  try {
    file = openNetcdf(bytes);
    const { axes, refused } = timeAxesOf(file);
    const [first] = refused;
    if (axes.length === 0 && first !== undefined)
      refuse(
        "timeRefused",
        `the time “${first.name}” ${first.why}`,
        "Give the file with times since a date of the calendar in use.",
      );
    const opened = file;
    const chosen = chooseAxis(axes, (axis) => usedAlong(opened, axis), answers);
    const { axis } = chosen;
    if (axis === undefined)
      return refuse(
        "noTime",
        `“${fileName}” has no coordinate of time`,
        "Give a file with a time axis, with units such as “hours since 2021-01-01”.",
      );
    const records = axis.variable.shape[0] ?? 0;
    if (records === 0)
      refuse("noRecords", `“${fileName}” has no records along “${axis.variable.name}”`, "Give a file with records.");
    if (records > MAX_SERIES_FILE_LINES)
      refuse(
        "tooManyLines",
        `“${fileName}” has more than ${MAX_SERIES_FILE_LINES} records`,
        "Cut it to the days around the storm.",
      );
    for (const { name, why } of refused)
      problems.add("warning", "timeRefused", `the time “${name}” ${why}`, "What lies along it was left out.");
    const times = { axis, utc: stampsOfAxis(file, axis), bounds: boundsOfAxis(file, axis) };
    return seriesAlong(file, times, variablesAlong(file, axis), { fileName, answers, problems, chosen });
  } catch (error) {
    // A size that a damaged header gives can be more than any array holds.
    const damaged = error instanceof RangeError ? new DamagedNetcdf("is damaged: it gives impossible sizes") : error;
    if (!(damaged instanceof DamagedNetcdf)) throw error;
    return refuse("damagedNetcdf", `“${fileName}” ${damaged.what}`, damaged.toDo);
  } finally {
    file?.close();
  }
}

function usedAlong(file: NetcdfFile, axis: TimeAxis): number {
  const columns = columnsOf(file, variablesAlong(file, axis));
  return (
    columns.filter(({ role }) => role !== "leftOut").length +
    columns.filter(({ role }) => role.startsWith("wind")).length
  );
}

/** Numeric variables along an axis, but for coordinates and bounds. */
function variablesAlong(file: NetcdfFile, { dimension }: TimeAxis): NetcdfVariable[] {
  const coordinates = new Set(file.variables.flatMap(({ dimensions }) => dimensions));
  return file.variables.filter(
    ({ name, kind, dimensions, attributes }) =>
      (kind === "integer" || kind === "real") &&
      dimensions.includes(dimension) &&
      !coordinates.has(name) &&
      !/ since /.test(attributes.get("units")?.text ?? "") &&
      !file.variables.some((other) => other.attributes.get("bounds")?.text === name),
  );
}
