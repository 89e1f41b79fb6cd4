import { readFile } from "node:fs/promises";
import { basename } from "node:path";
import { parseArgs } from "node:util";
import { summaryOfCast } from "~/readers/casts/cast-summary";
import { readCast } from "~/readers/casts/read-cast";
import { FILE_KINDS, kindOfFile, type FileKind } from "~/readers/kind-of-file";
import { readSeries } from "~/readers/read-series";
import { summaryOfReading } from "~/readers/read-summary";
import { UnreadableFile, type ReadingProblem } from "~/readers/reading";
import { readShape } from "~/readers/shapes/read-shape";
import { summaryOfShape } from "~/readers/shapes/shape-summary";
import { readTrack } from "~/readers/tracks/read-track";
import { summaryOfTrack } from "~/readers/tracks/track-summary";

interface Given {
  bytes: Uint8Array;
  fileName: string;
  zone: string | undefined;
  /** Latitude and longitude, degrees. */
  at: [number, number] | undefined;
}

/** Reads as the upload of each kind does, with the reader's own best answers. */
const READERS: Record<FileKind, (given: Given) => { understood: string[] }> = {
  series: ({ bytes, fileName, zone, at }) =>
    summaryOfReading(
      readSeries({
        bytes,
        fileName,
        answers: { ...(zone !== undefined && { zone }), ...(at && { place: at.join(",") }) },
      }),
    ),
  cast: ({ bytes, fileName, at }) =>
    summaryOfCast(readCast({ bytes, fileName, answers: at ? { latitude: at[0] } : {} })),
  track: ({ bytes, fileName }) => summaryOfTrack(readTrack({ bytes, fileName })),
  shape: ({ bytes, fileName }) => summaryOfShape(readShape({ bytes, fileName })),
};

/**
 * `galeprint read FILE [--kind series|cast|track|shape] [--zone Z] [--at LAT,LON]`: reads a data file as an upload would
 * and prints what was understood as JSON. Without a kind, the content decides.
 * @returns exit code: 0 where the file was read, 1 where it could not be
 */
export async function read(args: string[]): Promise<number> {
  const asked = parseArguments(args);
  if ("problem" in asked) return printProblems(asked.problem);
  let bytes: Uint8Array;
  try {
    bytes = await readFile(asked.file);
  } catch (error) {
    const reason = error instanceof Error && "code" in error ? String(error.code) : "unknown reason";
    return printProblems({
      severity: "error",
      code: "fileNotOpened",
      message: `${asked.file} could not be opened (${reason}). Check the path.`,
    });
  }
  const fileName = basename(asked.file);
  const kind = asked.kind ?? kindOfFile(bytes, fileName);
  try {
    const summary = READERS[kind]({ bytes, fileName, zone: asked.zone, at: asked.at });
    const told = asked.kind === undefined && kind !== "series" ? [`Kind: ${kind} (by content)`] : [];
    print({ ...summary, understood: [...told, ...summary.understood] });
    return 0;
  } catch (error) {
    if (!(error instanceof UnreadableFile)) throw error;
    print({ kind, problems: error.problems });
    return 1;
  }
}

interface Asked {
  file: string;
  /** Undefined: by content. */
  kind: FileKind | undefined;
  zone: string | undefined;
  /** Latitude and longitude, degrees. */
  at: [number, number] | undefined;
}

function parseArguments(args: string[]): Asked | { problem: ReadingProblem } {
  const usage = "Use: galeprint read FILE [--kind series|cast|track|shape] [--zone ZONE] [--at LAT,LON].";
  const wrong = (what: string): { problem: ReadingProblem } => ({
    problem: { severity: "error", code: "usage", message: `${what} ${usage}` },
  });
  try {
    const { values, positionals } = parseArgs({
      args,
      allowPositionals: true,
      options: { kind: { type: "string" }, zone: { type: "string" }, at: { type: "string" } },
    });
    const file = positionals[0];
    if (file === undefined || positionals.length > 1) return wrong("One file is needed.");
    const kind = FILE_KINDS.find((candidate) => candidate === values.kind);
    if (values.kind !== undefined && kind === undefined) return wrong(`“${values.kind}” is no kind of file.`);
    const at = values.at === undefined ? undefined : placeOf(values.at);
    if (at === null) return wrong(`“${values.at}” is no place: write degrees, as 51.5,-8.2.`);
    return { file, kind, zone: values.zone, at };
  } catch (error) {
    return wrong(error instanceof Error ? `${error.message}.` : "The arguments were not understood.");
  }
}

function placeOf(text: string): [number, number] | null {
  const [latitude, longitude, more] = text.split(",").map(Number);
  const holds = Math.abs(latitude) <= 90 && Math.abs(longitude) <= 360 && more === undefined;
  return holds ? [latitude, longitude] : null;
}

function printProblems(...problems: ReadingProblem[]): number {
  print({ problems });
  return 1;
}

function print(value: unknown): void {
  process.stdout.write(`${JSON.stringify(value, null, 2)}\n`);
}
