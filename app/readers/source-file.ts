import { decodeText, type DecodedText } from "./decode-text";
import { binaryKind } from "./magic-bytes";
import type { ProblemList } from "./problem-list";

/** A file of text, taken apart once for every recogniser. */
export interface SourceFile {
  fileName: string;
  decoded: DecodedText;
  /** Without line ends. */
  lines: string[];
}

/** Largest series file that is read, bytes. */
export const MAX_SERIES_FILE_BYTES = 64 * 1024 * 1024;

/** Most lines that are read: 38 years of 10-minute records. Beyond, a table no longer fits into memory beside its cells. */
export const MAX_SERIES_FILE_LINES = 2_000_000;

/**
 * Opens a file as text.
 * @returns null where it is none; `problems` then says why and what to do
 */
export function openText(bytes: Uint8Array, fileName: string, problems: ProblemList): SourceFile | null {
  if (!isSizeAllowed(bytes, fileName, problems)) return null;
  if (bytes.length === 0) {
    problems.add(
      "error",
      "emptyFile",
      `“${fileName}” is empty`,
      "Check that the download or export was finished, and give it again.",
    );
    return null;
  }
  const binary = binaryKind(bytes);
  if (binary !== null) {
    problems.add("error", "notText", `“${fileName}” is ${binary.what}, not a table of text`, binary.toDo);
    return null;
  }
  const decoded = decodeText(bytes);
  if (decoded === null) {
    problems.add(
      "error",
      "notText",
      `“${fileName}” is a binary file of a kind that is not known`,
      "Export the table as text (CSV) and give that file.",
    );
    return null;
  }
  if (countLines(decoded.text) > MAX_SERIES_FILE_LINES) {
    problems.add(
      "error",
      "tooManyLines",
      `“${fileName}” has more than ${MAX_SERIES_FILE_LINES} lines`,
      "Cut it to the days around the storm.",
    );
    return null;
  }
  const lines = decoded.text.split("\n");
  if (lines.every((line) => line.trim() === "")) {
    problems.add(
      "error",
      "emptyFile",
      `“${fileName}” has no text in it`,
      "Check that the download or export was finished, and give it again.",
    );
    return null;
  }
  return { fileName, decoded, lines };
}

/** Whether a file is small enough to be read; else `problems` says so. */
export function isSizeAllowed(bytes: Uint8Array, fileName: string, problems: ProblemList): boolean {
  if (bytes.length <= MAX_SERIES_FILE_BYTES) return true;
  const size = Math.ceil(bytes.length / (1024 * 1024));
  problems.add(
    "error",
    "tooLarge",
    `“${fileName}” has ${size} MB; the limit is ${MAX_SERIES_FILE_BYTES / (1024 * 1024)} MB`,
    "Cut it to the days around the storm.",
  );
  return false;
}

function countLines(text: string): number {
  let count = 1;
  for (let at = text.indexOf("\n"); at >= 0; at = text.indexOf("\n", at + 1)) count += 1;
  return count;
}
