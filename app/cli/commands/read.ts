import { readFile } from "node:fs/promises";
import { basename } from "node:path";
import { parseArgs } from "node:util";
import { readSeries } from "~/readers/read-series";
import { summaryOfReading } from "~/readers/read-summary";
import { UnreadableFile, type ReadingProblem } from "~/readers/reading";

const KINDS = ["series", "cast", "track", "shape"] as const;
type Kind = (typeof KINDS)[number];

/**
 * `galeprint read FILE [--kind series|cast|track|shape] [--zone Z] [--at LAT,LON]`: reads a data file as an upload would
 * and prints what was understood as JSON.
 * @returns exit code: 0 where the file was read, 1 where it could not be
 */
export async function read(args: string[]): Promise<number> {
  const asked = parseArguments(args);
  if ("problem" in asked) return printProblems(asked.problem);
  if (asked.kind !== "series") {
    return printProblems({
      severity: "error",
      code: "kindNotRead",
      message: `Files of the kind “${asked.kind}” are not read yet. Give a series.`,
    });
  }
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
  try {
    const reading = readSeries({
      bytes,
      fileName: basename(asked.file),
      answers: asked.zone === undefined ? {} : { zone: asked.zone },
    });
    print(summaryOfReading(reading));
    return 0;
  } catch (error) {
    if (!(error instanceof UnreadableFile)) throw error;
    print({ kind: "series", problems: error.problems });
    return 1;
  }
}

interface Asked {
  file: string;
  kind: Kind;
  zone: string | undefined;
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
    const kind = KINDS.find((candidate) => candidate === (values.kind ?? "series"));
    return kind === undefined ? wrong(`“${values.kind}” is no kind of file.`) : { file, kind, zone: values.zone };
  } catch (error) {
    return wrong(error instanceof Error ? `${error.message}.` : "The arguments were not understood.");
  }
}

function printProblems(...problems: ReadingProblem[]): number {
  print({ problems });
  return 1;
}

function print(value: unknown): void {
  process.stdout.write(`${JSON.stringify(value, null, 2)}\n`);
}
