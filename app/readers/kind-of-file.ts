import { isCastText } from "./casts/read-cast";
import { decodeText } from "./decode-text";
import { isWorkbook } from "./magic-bytes";
import { isArchive } from "./shapes/open-archive";
import { isShapefile, isShapeText } from "./shapes/read-shape";
import { isTrackText } from "./tracks/read-track";

export const FILE_KINDS = ["series", "cast", "track", "shape"] as const;
export type FileKind = (typeof FILE_KINDS)[number];

/**
 * What a file unmistakably is by its content: a cast, a track or shapes have marks that no series has. All else is taken
 * for a series, which a table of any kind may be.
 */
export function kindOfFile(bytes: Uint8Array, fileName: string): FileKind {
  if (isShapefile(bytes) || (isArchive(bytes) && !isWorkbook(bytes))) return "shape";
  const decoded = decodeText(bytes);
  if (!decoded) return "series";
  const source = { fileName, decoded, lines: decoded.text.split("\n") };
  if (isTrackText(source)) return "track";
  if (isCastText(source)) return "cast";
  return isShapeText(decoded.text) ? "shape" : "series";
}
