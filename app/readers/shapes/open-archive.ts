import { unzipSync } from "fflate";
import type { ProblemList } from "../problem-list";

/** Largest size of an archive once unpacked, bytes. */
const MAX_UNPACKED_BYTES = 128 * 1024 * 1024;
const MAX_FILES = 2000;

/** Whether bytes are a zip archive. */
export function isArchive(bytes: Uint8Array): boolean {
  return bytes[0] === 0x50 && bytes[1] === 0x4b && (bytes[2] === 3 || bytes[2] === 5);
}

/**
 * The files of a zip archive that are wanted, by name.
 * @returns null where it cannot be read or would unpack beyond the limit; `problems` says why
 */
export function openArchive(bytes: Uint8Array, wanted: RegExp, problems: ProblemList): Map<string, Uint8Array> | null {
  const refuse = (what: string, toDo: string) => {
    problems.add("error", "badArchive", what, toDo);
    return null;
  };
  try {
    let [size, count] = [0, 0];
    unzipSync(bytes, {
      filter: ({ originalSize }) => {
        size += originalSize;
        count += 1;
        return false;
      },
    });
    if (size > MAX_UNPACKED_BYTES || count > MAX_FILES) {
      return refuse(
        `the archive would unpack to ${Math.ceil(size / 1048576)} MB in ${count} files; the limits are ${MAX_UNPACKED_BYTES / 1048576} MB and ${MAX_FILES}`,
        "Give an archive of the study area alone.",
      );
    }
    return new Map(Object.entries(unzipSync(bytes, { filter: ({ name }) => wanted.test(name) })));
  } catch {
    return refuse("the archive is damaged", "Zip the files anew.");
  }
}
