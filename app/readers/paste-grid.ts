import { UnreadableFile, type ReadingAnswers, type SeriesReading } from "./reading";
import { readSeries } from "./read-series";

/** How a paste is called where a file would have its name. */
export const PASTED_NAME = "pasted cells";

/**
 * Reads cells pasted from a spreadsheet, or typed into the grid: tab-separated (or any delimiter a file may have), a
 * header line or none, a time and one or more channels. The same path as a file takes, so the same problems and questions.
 * @param input.text the pasted text
 * @throws UnreadableFile where nothing can be read
 */
export function readPastedGrid(input: { text: string; answers?: ReadingAnswers }): SeriesReading {
  try {
    return readSeries({
      bytes: new TextEncoder().encode(input.text),
      fileName: PASTED_NAME,
      ...(input.answers === undefined ? {} : { answers: input.answers }),
    });
  } catch (error) {
    if (!(error instanceof UnreadableFile)) throw error;
    const empty = error.problems.some(({ code }) => code === "emptyFile");
    if (!empty) throw error;
    throw new UnreadableFile([
      {
        severity: "error",
        code: "emptyFile",
        message: "Nothing was pasted. Copy the cells with their header and paste them here.",
      },
    ]);
  }
}
