import { ProblemList } from "./problem-list";
import { UnreadableFile, type ReadingAnswers, type SeriesReading } from "./reading";
import { TEXT_RECOGNISERS } from "./recognisers";
import { openText } from "./source-file";
import { isNetcdf, isWorkbook } from "./magic-bytes";
import { readNetcdf } from "./netcdf/read-netcdf";
import { readWorkbook } from "./workbook";

export { MAX_SERIES_FILE_BYTES } from "./source-file";

/**
 * Reads a file of a time series: wind, rain, heat, temperatures. The format is recognised by content, not by the name.
 * Takes time in proportion to the size of the file.
 * @param input.bytes the file as it came
 * @param input.answers what a person answered on the reading sheet; the same bytes, name and answers give the same reading
 * @returns channels in SI-based units on an ascending UTC axis (seconds since 1970), with everything that was understood,
 *   asked and found wrong
 * @throws UnreadableFile where nothing can be read; its `problems` say why and what to do
 */
export function readSeries(input: { bytes: Uint8Array; fileName: string; answers?: ReadingAnswers }): SeriesReading {
  const problems = new ProblemList();
  if (isWorkbook(input.bytes)) return readWorkbook(input.bytes, input.fileName, input.answers ?? {}, problems);
  if (isNetcdf(input.bytes)) return readNetcdf(input.bytes, input.fileName, input.answers ?? {}, problems);
  const source = openText(input.bytes, input.fileName, problems);
  const recogniser = source === null ? undefined : TEXT_RECOGNISERS.find((candidate) => candidate.recognises(source));
  if (source === null || recogniser === undefined) throw new UnreadableFile(problems.toArray());
  return recogniser.read(source, input.answers ?? {}, problems);
}
